/**
 * Decimal logarithm of a positive number: the abscissa of every plot and interpolation over log frequency.
 * @param value positive, in any unit (Hz for a frequency axis).
 * @returns log10(value); −Infinity for 0, NaN below.
 * @example log10Of(1e9) // 9
 */
export function log10Of(value: number): number {
  return Math.log10(value);
}

/**
 * The number whose decimal logarithm is given.
 * @param exponent decimal logarithm.
 * @returns 10^exponent.
 * @example powerOfTen(9) // 1e9
 */
export function powerOfTen(exponent: number): number {
  return 10 ** exponent;
}
