import { decibelsFromFieldRatio, decibelsFromPowerRatio, fieldRatioFromDecibels, powerRatioFromDecibels } from '@leeside/units/decibels';
import type { SweepSettings } from '@leeside/trace-reading/sweep';
import type { FloorLevel } from './noise-floor.js';
import { allowanceAtThresholdDb, excessDb } from './noise-statistics.js';

/** Everything that is known at one frequency before the subtraction. Levels in the unit of the pair. */
export interface Reading {
  readonly referenceLevel: number;
  readonly enclosedLevel: number;
  /** Null where nothing is known of the noise. */
  readonly floor: FloorLevel | null;
  /** Level of what comes round the sample; null where it was not measured. */
  readonly leakageLevel: number | null;
  /** C_R − C_E + T_E − T_R of equation (5), dB. */
  readonly correctionDb: number;
  readonly settings: SweepSettings;
}

/** Attenuation at one frequency. */
export interface Attenuation {
  readonly attenuationDb: number;
  readonly atLeast: boolean;
  readonly ceilingDb: number;
  readonly excessDb: number;
  readonly noiseTakenOut: boolean;
}

const subtractBelowDb = 20;
const leakageWithinDb = 20;

/** Whether noise power adds to the reading as power: only for power-averaging detectors that were not held. */
export function averagesPower(settings: SweepSettings): boolean {
  const isPowerDetector = settings.detector === 'rms' || (settings.detector === 'average' && settings.averaging === 'power');
  return isPowerDetector && settings.traceMode !== 'max hold' && settings.traceMode !== 'min hold' && settings.averaging !== 'log' && settings.averaging !== 'voltage';
}

function withoutNoise(level: number, noisePowerLevel: number): number {
  return decibelsFromPowerRatio(powerRatioFromDecibels(level) - powerRatioFromDecibels(noisePowerLevel));
}

/**
 * Exact or at least, equations (5) and (6): below the threshold the reading bounds; within 20 dB of a leakage it bounds; else it is exact.
 * @param reading levels at one frequency.
 * @returns attenuation in dB with its kind, ceiling (NaN without a floor) and excess.
 */
export function attenuationOf(reading: Reading): Attenuation {
  const { referenceLevel, enclosedLevel, floor, leakageLevel, correctionDb } = reading;
  const from = (level: number): number => referenceLevel - level + correctionDb;
  const bounding = floor === null ? NaN : floor.thresholdLevel + allowanceAtThresholdDb(floor.looks);
  const ceilingDb = from(bounding);
  if (floor !== null && enclosedLevel < floor.thresholdLevel) return { attenuationDb: ceilingDb, atLeast: true, ceilingDb, excessDb: 0, noiseTakenOut: false };
  if (leakageLevel !== null && enclosedLevel < leakageLevel + leakageWithinDb) {
    const together = decibelsFromFieldRatio(fieldRatioFromDecibels(enclosedLevel) + fieldRatioFromDecibels(leakageLevel));
    return { attenuationDb: from(together), atLeast: true, ceilingDb, excessDb: 0, noiseTakenOut: false };
  }
  const overNoiseDb = floor === null ? Infinity : enclosedLevel - floor.noisePowerLevel;
  if (floor !== null && averagesPower(reading.settings) && overNoiseDb < subtractBelowDb && overNoiseDb > 0) {
    return { attenuationDb: from(withoutNoise(enclosedLevel, floor.noisePowerLevel)), atLeast: false, ceilingDb, excessDb: 0, noiseTakenOut: true };
  }
  const excess = floor === null || overNoiseDb > 40 ? 0 : excessDb(overNoiseDb, floor.looks);
  return { attenuationDb: from(enclosedLevel), atLeast: false, ceilingDb, excessDb: excess, noiseTakenOut: false };
}
