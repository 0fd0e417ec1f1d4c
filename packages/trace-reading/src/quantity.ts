import { frequencyHzFrom } from '@leeside/units/frequency-unit';
import { scanEnd, scanNumber } from './scan-number.js';
import { frequencyUnitIn, frequencyUnitOf, levelUnitIn, type DeclaredLevelUnit } from './unit-words.js';
import type { FrequencyUnit } from '@leeside/units/frequency-unit';

/** A number at the beginning of a text, with what follows it. */
export function leadingNumber(text: string): { value: number; rest: string } | null {
  const trimmed = text.trim();
  for (const mark of ['.', ',']) {
    const value = scanNumber(trimmed, 0, trimmed.length, mark.charCodeAt(0));
    if (!Number.isFinite(value)) continue;
    const rest = trimmed.slice(scanEnd.at).trim();
    if (mark === '.' && /^,\d/.test(rest)) continue;
    return { value, rest: rest.replace(/^\|/, '').trim() };
  }
  return null;
}

/** A frequency of the preamble: its number and its unit, from value or key; the unit is null where none is told. */
export function frequencyValue(value: string, keyText: string): { value: number; unit: FrequencyUnit | null; hz: number } | null {
  const number = leadingNumber(value);
  if (number === null) return null;
  const unit = frequencyUnitOf(number.rest.split('|')[0] ?? '') ?? frequencyUnitIn(number.rest) ?? frequencyUnitIn(keyText);
  return { value: number.value, unit, hz: unit === null ? number.value : frequencyHzFrom(number.value, unit) };
}

/** A level of the preamble with its unit, null where none is told. */
export function levelValue(value: string, keyText: string): { value: number; unit: DeclaredLevelUnit | null } | null {
  const number = leadingNumber(value);
  return number === null ? null : { value: number.value, unit: levelUnitIn(number.rest) ?? levelUnitIn(keyText) };
}

const secondsPerUnit: Readonly<Record<string, number>> = { s: 1, sec: 1, ms: 1e-3, us: 1e-6, '\u00b5s': 1e-6, min: 60 };

/** A time in seconds; null where no unit is told. */
export function secondsValue(value: string, keyText: string): number | null {
  const number = leadingNumber(value);
  const unit = /^[a-z\u00b5\u03bc]+/i.exec(number?.rest ?? '')?.[0] ?? /[[(]([a-z\u00b5\u03bc]+)[\])]/i.exec(keyText)?.[1] ?? '';
  const factor = secondsPerUnit[unit.toLowerCase().replace('\u03bc', '\u00b5')];
  return number === null || factor === undefined ? null : number.value * factor;
}
