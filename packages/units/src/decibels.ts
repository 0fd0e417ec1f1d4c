/** The only place where a ratio becomes decibels or decibels a ratio. */

/**
 * Power ratio in decibels, 10·log10(ratio).
 * @param ratio dimensionless power ratio, ≥ 0; 0 gives −Infinity.
 * @returns decibels.
 * @source definition of the decibel (IEC 60027-3).
 * @example decibelsFromPowerRatio(100) // 20
 */
export function decibelsFromPowerRatio(ratio: number): number {
  return 10 * Math.log10(ratio);
}

/**
 * Power ratio of a level difference, 10^(dB/10).
 * @param decibels level difference in dB; −Infinity gives 0.
 * @returns dimensionless power ratio.
 * @source definition of the decibel (IEC 60027-3).
 * @example powerRatioFromDecibels(3) // 1.9953
 */
export function powerRatioFromDecibels(decibels: number): number {
  return 10 ** (decibels / 10);
}

/**
 * Field or voltage ratio in decibels, 20·log10(ratio).
 * @param ratio dimensionless ratio of two root-power quantities, ≥ 0.
 * @returns decibels.
 * @source definition of the decibel (IEC 60027-3).
 * @example decibelsFromFieldRatio(10) // 20
 */
export function decibelsFromFieldRatio(ratio: number): number {
  return 20 * Math.log10(ratio);
}

/**
 * Field or voltage ratio of a level difference, 10^(dB/20).
 * @param decibels level difference in dB.
 * @returns dimensionless ratio of two root-power quantities.
 * @source definition of the decibel (IEC 60027-3).
 * @example fieldRatioFromDecibels(6) // 1.9953
 */
export function fieldRatioFromDecibels(decibels: number): number {
  return 10 ** (decibels / 20);
}
