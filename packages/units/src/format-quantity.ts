import { hertzPerUnit, type FrequencyUnit } from './frequency-unit.js';

const thinSpace = '\u2009';
const minusSign = '\u2212';

/**
 * Digits with a real minus sign and a fixed number of decimals.
 * @param value any finite number.
 * @param decimals digits after the decimal point.
 * @param locale BCP 47 tag for the decimal mark; grouping is never used.
 * @example formatNumber(-31.04, 1) // "−31.0"
 */
export function formatNumber(value: number, decimals: number, locale = 'en'): string {
  const digits = Math.abs(value).toLocaleString(locale, {
    minimumFractionDigits: decimals, maximumFractionDigits: decimals, useGrouping: false,
  });
  const isZero = Number(Math.abs(value).toFixed(decimals)) === 0;
  return value < 0 && !isZero ? minusSign + digits : digits;
}

/**
 * A frequency as an engineer writes it: the largest unit that keeps the number at 1 or more, no trailing zeros.
 * @param frequencyHz frequency in Hz, finite.
 * @param significant significant digits kept.
 * @example formatFrequency(433.92e6) // "433.92 MHz"
 */
export function formatFrequency(frequencyHz: number, significant = 6, locale = 'en'): string {
  const magnitude = Math.abs(frequencyHz);
  const unit: FrequencyUnit = magnitude >= 1e9 ? 'GHz' : magnitude >= 1e6 ? 'MHz' : magnitude >= 1e3 ? 'kHz' : 'Hz';
  const digits = Math.abs(frequencyHz / hertzPerUnit[unit]).toLocaleString(locale, {
    maximumSignificantDigits: significant, useGrouping: false,
  });
  return `${frequencyHz < 0 ? minusSign : ''}${digits}${thinSpace}${unit}`;
}

/**
 * A level or attenuation with its unit: thin space, real minus sign. Logarithmic units never take an SI prefix.
 * @param value the number in `unit`.
 * @param unit unit text, such as "dB" or "dBm".
 * @param decimals digits after the decimal point.
 * @example formatLevel(-31, 'dBm') // "−31.0 dBm"
 */
export function formatLevel(value: number, unit: string, decimals = 1, locale = 'en'): string {
  return `${formatNumber(value, decimals, locale)}${thinSpace}${unit}`;
}

/**
 * An attenuation; a lower bound carries its mark in front.
 * @param attenuationDb attenuation or its lower bound in dB.
 * @param atLeast whether the number is a lower bound.
 * @example formatAttenuation(64, true) // "≥ 64.0 dB"
 */
export function formatAttenuation(attenuationDb: number, atLeast: boolean, decimals = 1, locale = 'en'): string {
  return `${atLeast ? `≥${thinSpace}` : ''}${formatLevel(attenuationDb, 'dB', decimals, locale)}`;
}
