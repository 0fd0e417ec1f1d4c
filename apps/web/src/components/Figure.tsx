import { formatFrequency, formatLevel } from '@leeside/units/format-quantity';
import { readerLocale, shownUnit } from './reader-locale';
import { shownAttenuation } from './shown-attenuation';

/** A frequency as an engineer writes it, the exact hertz in the tooltip. */
export function Frequency({ hz }: { hz: number }) {
  return <data className="figure" value={hz} title={`${String(hz)} Hz`}>{formatFrequency(hz, 6, readerLocale())}</data>;
}

export function FrequencyRange({ fromHz, toHz }: { fromHz: number; toHz: number }) {
  return <span className="whitespace-nowrap"><Frequency hz={fromHz} /> – <Frequency hz={toHz} /></span>;
}

export function Attenuation({ db, atLeast, decimals = 1 }: { db: number; atLeast: boolean; decimals?: number }) {
  const text = shownAttenuation(db, atLeast, readerLocale(), decimals);
  return <data className="figure" value={db} title={atLeast ? `at least ${String(db)} dB` : `${String(db)} dB`}>{text}</data>;
}

export function Level({ level, unit, decimals = 1 }: { level: number; unit: string; decimals?: number }) {
  return <data className="figure" value={level} title={`${String(level)} ${unit}`}>{formatLevel(level, shownUnit(unit), decimals, readerLocale())}</data>;
}

/** Where there is no number, the reason or a dash that is read aloud. */
export function NoFigure({ why = 'none' }: { why?: string }) {
  return <span className="text-faded" title={why}><span aria-hidden="true">–</span><span className="sr-only">{why}</span></span>;
}
