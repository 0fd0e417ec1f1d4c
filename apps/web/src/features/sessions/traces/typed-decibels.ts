import { parseLevel } from '@leeside/units/parse-quantity';
import { formatNumber } from '@leeside/units/format-quantity';

/** Says what is wrong with a level that may be left empty. */
export const checkLevel = (unit: string, least: number, most: number) => (text: string): string | null => {
  if (text.trim() === '') return null;
  const value = parseLevel(text, unit);
  if (value === null) return `Not a number in ${unit}: “${text}”.`;
  return value < least || value > most ? `Must lie from ${formatNumber(least, 0)} to ${formatNumber(most, 0)} ${unit}.` : null;
};

export const levelOrNull = (unit: string) => (text: string): number | null => (text.trim() === '' ? null : parseLevel(text, unit));

export const levelText = (value: number | null): string => (value === null ? '' : String(value).replace('-', '\u2212'));
