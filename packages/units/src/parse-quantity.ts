import { frequencyHzFrom, type FrequencyUnit } from './frequency-unit.js';

const number = /^([+\-\u2212]?)(\d+(?:[.,]\d*)?|[.,]\d+)(?:[eE]([+\-\u2212]?\d+))?$/;

/**
 * A number as a person types it: point or comma as decimal mark, either minus sign, optional exponent; nothing else.
 * @param text what was typed, blanks around it allowed.
 * @returns the number, or null where the text is no single finite number.
 * @example parseTypedNumber('−31,5') // −31.5
 */
export function parseTypedNumber(text: string): number | null {
  const parts = number.exec(text.trim());
  if (!parts) return null;
  const exponent = (parts[3] ?? '0').replace('\u2212', '-');
  const value = Number(`${(parts[2] ?? '').replace(',', '.')}e${exponent}`);
  if (!Number.isFinite(value)) return null;
  return parts[1] === '-' || parts[1] === '\u2212' ? -value : value;
}

const unitOfSuffix: Record<string, FrequencyUnit> = {
  '': 'Hz', hz: 'Hz', k: 'kHz', khz: 'kHz', m: 'MHz', mhz: 'MHz', g: 'GHz', ghz: 'GHz',
};

/**
 * A frequency as a person types it: "2.4 GHz", "2,4 GHz", "433.92M", "915e6".
 * @param text what was typed; no unit means hertz.
 * @returns frequency in Hz, > 0, or null where it cannot be understood.
 * @example parseFrequency('433.92M') // 433920000
 */
export function parseFrequency(text: string): number | null {
  const parts = /^(.*?)\s*([kmg]?(?:hz)?)$/i.exec(text.trim());
  const value = parseTypedNumber(parts?.[1] ?? '');
  const unit = unitOfSuffix[(parts?.[2] ?? '').toLowerCase()];
  if (value === null || unit === undefined || value <= 0) return null;
  return frequencyHzFrom(value, unit);
}

/**
 * A level as a person types it: "-31 dBm", "−31,5", "64 dB".
 * @param text what was typed; the unit may be left out.
 * @param unit the unit the field stands for; another one is not understood.
 * @returns the number in `unit`, or null where it cannot be understood.
 * @example parseLevel('-31 dBm', 'dBm') // −31
 */
export function parseLevel(text: string, unit: string): number | null {
  const trimmed = text.trim();
  const bare = trimmed.toLowerCase().endsWith(unit.toLowerCase()) ? trimmed.slice(0, -unit.length) : trimmed;
  return parseTypedNumber(bare);
}
