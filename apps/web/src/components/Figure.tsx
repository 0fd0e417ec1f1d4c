import { formatFrequency, formatLevel, formatNumber } from '@leeside/units/format-quantity';
import { readerLocale, shownUnit } from './reader-locale';
import { cutBound, shownAttenuation } from './shown-attenuation';

/** A frequency as an engineer writes it, the exact hertz in the tooltip. */
export function Frequency({ hz, significant = 6 }: { hz: number; significant?: number }) {
  return <data className="figure" value={hz} title={`${String(hz)} Hz`}>{formatFrequency(hz, significant, readerLocale())}</data>;
}

export function FrequencyRange({ fromHz, toHz, significant = 6 }: { fromHz: number; toHz: number; significant?: number }) {
  return <span className="whitespace-nowrap"><Frequency hz={fromHz} significant={significant} /> – <Frequency hz={toHz} significant={significant} /></span>;
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

/** Decibels in a column whose head carries the unit. */
export function Decibels({ db, atLeast = false, decimals = 1 }: { db: number; atLeast?: boolean; decimals?: number }) {
  const digits = formatNumber(atLeast ? cutBound(db, decimals) : db, decimals, readerLocale());
  return <data className="figure" value={db} title={atLeast ? `at least ${String(db)} dB` : `${String(db)} dB`}>{atLeast && '\u2265\u2009'}{digits}</data>;
}
