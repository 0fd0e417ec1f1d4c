import { decibelsFromFieldRatio, decibelsFromPowerRatio, powerRatioFromDecibels } from './decibels.js';

/** Units in which an analyzer states a level across its input impedance. */
export const absoluteLevelUnits = ['dBm', 'dBµV', 'dBmV', 'dBV', 'V', 'mV', 'µV', 'W', 'mW', 'µW'] as const;
export type AbsoluteLevelUnit = (typeof absoluteLevelUnits)[number];

/** Units in which a sweep is kept: absolute power, transmission data, field strength. Only equal units pair. */
export const keptLevelUnits = ['dBm', 'dB', 'dBµV/m'] as const;
export type KeptLevelUnit = (typeof keptLevelUnits)[number];

const decibelsOverVolt: Partial<Record<AbsoluteLevelUnit, number>> = { dBV: 0, dBmV: -60, 'dBµV': -120 };
const voltsPerUnit: Partial<Record<AbsoluteLevelUnit, number>> = { V: 1, mV: 1e-3, 'µV': 1e-6 };
const milliwattsPerUnit: Partial<Record<AbsoluteLevelUnit, number>> = { W: 1e3, mW: 1, 'µW': 1e-3 };

/**
 * What is added to a level in dB over 1 V to get dBm: 10·log10(1000/R).
 * @param impedanceOhm load impedance in ohm, > 0.
 * @returns decibels; −106.99 dB apart from dBµV at 50 Ω.
 * @source checks: 106.9897 dB at 50 Ω, 108.7506 at 75 Ω, 117.7815 at 600 Ω (computed).
 * @example dbmOverDbv(50) // 13.0103
 */
export function dbmOverDbv(impedanceOhm: number): number {
  return decibelsFromPowerRatio(1000 / impedanceOhm);
}

/**
 * A level in any absolute unit as dBm at a stated impedance. P = U²/R for voltages.
 * @param value the level in `unit`; linear units must be > 0 (0 gives −Infinity).
 * @param unit unit of the value.
 * @param impedanceOhm impedance across which a voltage stands, in ohm; unused for power units.
 * @returns level in dBm.
 * @example levelDbmFrom(0, 'dBµV', 50) // −106.99
 */
export function levelDbmFrom(value: number, unit: AbsoluteLevelUnit, impedanceOhm: number): number {
  if (unit === 'dBm') return value;
  const overVolt = decibelsOverVolt[unit];
  if (overVolt !== undefined) return value + overVolt + dbmOverDbv(impedanceOhm);
  const volts = voltsPerUnit[unit];
  if (volts !== undefined) return decibelsFromFieldRatio(value * volts) + dbmOverDbv(impedanceOhm);
  return decibelsFromPowerRatio(value * (milliwattsPerUnit[unit] ?? NaN));
}

/**
 * A level in dBm as dBµV across an impedance: the way back of {@link levelDbmFrom}.
 * @param levelDbm level in dBm.
 * @param impedanceOhm load impedance in ohm, > 0.
 * @returns level in dBµV.
 * @example levelDbuvFrom(-107, 50) // −0.0103
 */
export function levelDbuvFrom(levelDbm: number, impedanceOhm: number): number {
  return levelDbm - dbmOverDbv(impedanceOhm) + 120;
}

/**
 * Volts across an impedance for a level in dBm.
 * @param levelDbm level in dBm.
 * @param impedanceOhm load impedance in ohm, > 0.
 * @returns effective voltage in V.
 * @example voltsFromDbm(0, 50) // 0.223607
 */
export function voltsFromDbm(levelDbm: number, impedanceOhm: number): number {
  return Math.sqrt((powerRatioFromDecibels(levelDbm) / 1000) * impedanceOhm);
}
