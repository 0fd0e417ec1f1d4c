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
  const { referenceLevel, floor, correctionDb } = reading;
  const from = (level: number): number => referenceLevel - level + correctionDb;
  const ceilingDb = floor === null ? NaN : from(floor.thresholdLevel + allowanceAtThresholdDb(floor.looks));
  const { level, ...kind } = levelThatCounts(reading);
  return { attenuationDb: kind.isInNoise ? ceilingDb : from(level), atLeast: kind.isInNoise || kind.isByLeakage, ceilingDb, excessDb: kind.excessDb, noiseTakenOut: kind.noiseTakenOut };
}

interface CountingLevel {
  readonly level: number;
  readonly isInNoise: boolean;
  readonly isByLeakage: boolean;
  readonly noiseTakenOut: boolean;
  readonly excessDb: number;
}

const farOverNoiseDb = 40;

/** The level that is subtracted, and in which of the cases of equation (6) the reading is. */
function levelThatCounts({ enclosedLevel, floor, leakageLevel, settings }: Reading): CountingLevel {
  const plain = { level: enclosedLevel, isInNoise: false, isByLeakage: false, noiseTakenOut: false, excessDb: 0 };
  if (floor !== null && enclosedLevel < floor.thresholdLevel) return { ...plain, isInNoise: true };
  if (leakageLevel !== null && enclosedLevel < leakageLevel + leakageWithinDb) {
    return { ...plain, isByLeakage: true, level: decibelsFromFieldRatio(fieldRatioFromDecibels(enclosedLevel) + fieldRatioFromDecibels(leakageLevel)) };
  }
  if (floor === null) return plain;
  const overNoiseDb = enclosedLevel - floor.noisePowerLevel;
  if (averagesPower(settings) && overNoiseDb < subtractBelowDb && overNoiseDb > 0) return { ...plain, noiseTakenOut: true, level: withoutNoise(enclosedLevel, floor.noisePowerLevel) };
  return { ...plain, excessDb: overNoiseDb > farOverNoiseDb ? 0 : excessDb(overNoiseDb, floor.looks) };
}
