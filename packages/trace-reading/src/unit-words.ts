import type { FrequencyUnit } from '@leeside/units/frequency-unit';
import type { AbsoluteLevelUnit } from '@leeside/units/level-unit';

/** Level units that a file may declare: absolute ones, transmission in dB, field strength. */
export type DeclaredLevelUnit = AbsoluteLevelUnit | 'dB' | 'dBµV/m';

const frequencyUnits: Readonly<Record<string, FrequencyUnit>> = { hz: 'Hz', khz: 'kHz', mhz: 'MHz', ghz: 'GHz', thz: 'THz' };

/** The frequency unit that a text is, whole; null where it is none. */
export function frequencyUnitOf(text: string): FrequencyUnit | null {
  return frequencyUnits[text.trim().toLowerCase()] ?? null;
}

const micro = (text: string): string => text.replaceAll('\u03bc', '\u00b5');
const levelUnits: readonly (readonly [RegExp, DeclaredLevelUnit])[] = [
  [/^dB ?\(?m(?:W)?\)?$/i, 'dBm'], [/^dBmW$/i, 'dBm'], [/^dB ?\(?[\u00b5u]V\)?(?:\/m|PerMeter| per meter)$/i, 'dB\u00b5V/m'], [/^dB ?\(?[\u00b5u]V\)?$/i, 'dB\u00b5V'], [/^dB ?\(?mV\)?$/i, 'dBmV'], [/^dB ?\(?V\)?$/, 'dBV'],
  [/^dB$/i, 'dB'], [/^V(?:olts?)?$/, 'V'], [/^mV$/, 'mV'], [/^[\u00b5u]V$/, '\u00b5V'], [/^W(?:atts?)?$/, 'W'], [/^mW$/, 'mW'], [/^[\u00b5u]W$/, '\u00b5W'],
];

/** The level unit that a text is, whole; null where it is none. */
export function levelUnitOf(text: string): DeclaredLevelUnit | null {
  const bare = micro(text.trim());
  return levelUnits.find(([pattern]) => pattern.test(bare))?.[1] ?? null;
}

/** The pieces of a text that may be units: what stands in brackets, and its words. */
function pieces(text: string): string[] {
  const bracketed = [...text.matchAll(/[[(]([^\])]*)[\])]/g)].map((found) => found[1] ?? '');
  const unbracketed = text.replace(/[[(][^\])]*[\])]/g, ' ');
  return [...bracketed.flatMap((part) => [part, ...part.split(/[\s:,]+/)]), ...unbracketed.split(/[\s,;:=_]+/), ...unbracketed.split(/[\s,;:=_/]+/)].map((piece) => piece.replace(/^unit:?/i, '').trim()).filter((piece) => piece !== '');
}

/** The first frequency unit within a text, such as "Frequency [MHz]". */
export function frequencyUnitIn(text: string): FrequencyUnit | null {
  for (const piece of pieces(text)) {
    const unit = frequencyUnitOf(piece);
    if (unit !== null) return unit;
  }
  return null;
}

/** The first level unit within a text, such as "Amplitude (dBm)". A density (per Hz) is none. */
export function levelUnitIn(text: string): DeclaredLevelUnit | null {
  for (const piece of pieces(text)) {
    const unit = levelUnitOf(piece);
    if (unit !== null) return unit;
  }
  return null;
}
