import { valueAt } from '@leeside/units/value-at';
import { decibelsFromPowerRatio, powerRatioFromDecibels } from '@leeside/units/decibels';
import { largestOfNoiseDb, looksFromSpread } from './noise-statistics.js';
import { runningQuantile } from './running-rank.js';

/** What is known of the noise along a frequency axis; parallel columns. */
export interface NoiseFloor {
  readonly frequencyHz: Float64Array;
  /** N: median level of the noise. */
  readonly medianLevel: Float32Array;
  /** N̄ less N: mean noise power over the median level, dB. */
  readonly meanOverMedianDb: number;
  /** Looks fitted to the scatter of the noise. */
  readonly looks: number;
  /** Clean bins that it rests on. */
  readonly binCount: number;
}

/** Bins in the window of the floor. */
export const floorWindowBins = 101;
const scaledMad = 1.4826;
const clipAtMads = 5;
/** Noise power fluctuates to both sides; a trace that scatters less than this was averaged, not held. */
const leastScatterDb = 0.2;

function quantileOf(sorted: Float32Array, quantile: number): number {
  return valueAt(sorted, Math.min(sorted.length - 1, Math.max(0, Math.ceil(quantile * sorted.length) - 1)));
}

function residualsOf(level: Float32Array, median: Float32Array): Float32Array {
  return level.map((value, bin) => value - valueAt(median, bin));
}

/** Replaces what stands far above the running median by the median itself, until nothing does. */
function withoutStraySignals(level: Float32Array, windowBins: number): { clean: Float32Array; median: Float32Array } {
  const clean = Float32Array.from(level);
  let median = runningQuantile(clean, windowBins, 0.5);
  for (let round = 0; round < 5; round += 1) {
    const residuals = residualsOf(clean, median);
    const mad = quantileOf(residuals.map(Math.abs).sort(), 0.5) * scaledMad;
    const limit = clipAtMads * Math.max(mad, leastScatterDb);
    let clipped = 0;
    for (let bin = 0; bin < clean.length; bin += 1) {
      if (valueAt(residuals, bin) <= limit) continue;
      clean[bin] = valueAt(median, bin);
      clipped += 1;
    }
    if (clipped === 0) break;
    median = runningQuantile(clean, windowBins, 0.5);
  }
  return { clean, median };
}

/**
 * The floor from levels that hold noise alone: running median over 101 bins, stray signals clipped at 5 scaled MADs, looks fitted
 * to the scatter about the median, equations (1) to (3).
 * @param frequencyHz bins of the noise, ascending.
 * @param level levels there, dBm or dB.
 * @param windowBins width of the running median.
 * @returns the floor, or null where there are no bins.
 */
export function noiseFloorOf(frequencyHz: Float64Array, level: Float32Array, windowBins = floorWindowBins): NoiseFloor | null {
  if (level.length === 0) return null;
  const { clean, median } = withoutStraySignals(level, windowBins);
  const residuals = residualsOf(clean, median);
  const sorted = Float32Array.from(residuals).sort();
  const spreadDb = quantileOf(sorted, 0.75) - quantileOf(sorted, 0.25);
  let power = 0;
  for (const residual of residuals) power += powerRatioFromDecibels(residual);
  return {
    frequencyHz, medianLevel: median, meanOverMedianDb: decibelsFromPowerRatio(power / residuals.length),
    looks: level.length < 20 ? 1 : looksFromSpread(spreadDb), binCount: level.length,
  };
}

/** The floor at one frequency. */
export interface FloorLevel {
  /** N, median noise level. */
  readonly medianLevel: number;
  /** Mean power of the noise itself in the RBW: below the held level by what holding lifts it. */
  readonly noisePowerLevel: number;
  /** T: a reading below cannot be told from the noise. */
  readonly thresholdLevel: number;
  readonly looks: number;
}

function medianAt(floor: NoiseFloor, frequencyHz: number): number {
  const axis = floor.frequencyHz;
  let low = 0;
  let high = axis.length - 1;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (valueAt(axis, middle) < frequencyHz) low = middle + 1;
    else high = middle;
  }
  const before = low > 0 && frequencyHz - valueAt(axis, low - 1) < valueAt(axis, low) - frequencyHz ? low - 1 : low;
  return valueAt(floor.medianLevel, before);
}

/**
 * Floor and detection threshold at a frequency: T is the larger of N + m and of the quantile 1 − 0.01/k of the largest of n looks,
 * equation (4).
 * @param floor floor along its own axis; the nearest bin counts.
 * @param frequencyHz where it is asked for.
 * @param marginDb m, the lab's floor margin, dB.
 * @param binsRead k, the number of bins of which the largest is taken, ≥ 1.
 */
export function floorAt(floor: NoiseFloor, frequencyHz: number, marginDb: number, binsRead: number): FloorLevel {
  const medianLevel = medianAt(floor, frequencyHz);
  const medianOverPowerDb = largestOfNoiseDb(0.5, floor.looks);
  const quantileDb = largestOfNoiseDb(1 - 0.01 / binsRead, floor.looks) - medianOverPowerDb;
  const isAveraged = floor.looks >= 9_999;
  return {
    medianLevel, looks: floor.looks,
    noisePowerLevel: isAveraged ? medianLevel + floor.meanOverMedianDb : medianLevel - medianOverPowerDb,
    thresholdLevel: medianLevel + (isAveraged ? marginDb : Math.max(marginDb, quantileDb)),
  };
}
