/** Units in which frequencies are written, and how many hertz one of each is. */
export const hertzPerUnit = { Hz: 1, kHz: 1e3, MHz: 1e6, GHz: 1e9, THz: 1e12 } as const;
export type FrequencyUnit = keyof typeof hertzPerUnit;

/**
 * A frequency in hertz. Division is used for decimal fractions of a unit so that 433.92 MHz is 433 920 000 Hz and not a bit less.
 * @param value frequency in `unit`.
 * @param unit unit of the value.
 * @returns frequency in Hz, rounded to 1e-15 relative.
 * @example frequencyHzFrom(433.92, 'MHz') // 433920000
 */
export function frequencyHzFrom(value: number, unit: FrequencyUnit): number {
  return Number((value * hertzPerUnit[unit]).toPrecision(15));
}
