import { valueAt } from '@leeside/units/value-at';
import type { Sweep } from '@leeside/trace-reading/sweep';
import { firstNotBelow, medianStepHz } from './axis-search.js';
import { floorAt, noiseFloorOf, type NoiseFloor } from './noise-floor.js';

/** A carrier must stand this far above the threshold, and above the saddle to any higher one. */
export const carrierOverThresholdDb = 10;
const cleanDistance = 5;

/**
 * How far from its planned frequency a carrier is sought: the larger of the RBW and two bins.
 * @param sweep the sweep that is read.
 * @returns half-width in Hz.
 */
export function carrierToleranceHz(sweep: Sweep): number {
  return Math.max(sweep.settings.rbwHz ?? 0, 2 * medianStepHz(sweep.frequencyHz));
}

/** The bins from `from` to `to` (exclusive) that lie within a tolerance of a frequency. */
export function binsAround(axisHz: Float64Array, frequencyHz: number, toleranceHz: number): { from: number; to: number } {
  const slack = toleranceHz * 1e-9;
  return { from: firstNotBelow(axisHz, frequencyHz - toleranceHz - slack), to: firstNotBelow(axisHz, frequencyHz + toleranceHz + slack) };
}

/** The highest bin within a tolerance of a frequency; -1 where the sweep has none there. */
export function highestBin(sweep: Sweep, frequencyHz: number, toleranceHz: number): number {
  const { from, to } = binsAround(sweep.frequencyHz, frequencyHz, toleranceHz);
  let highest = -1;
  for (let bin = from; bin < to; bin += 1) if (highest < 0 || valueAt(sweep.level, bin) > valueAt(sweep.level, highest)) highest = bin;
  return highest;
}

/** Depth of the saddle on one side: the lowest level until a higher peak or the end. */
function saddleLevel(level: Float32Array, peak: number, step: 1 | -1): number {
  const top = valueAt(level, peak);
  let lowest = top;
  for (let bin = peak + step; bin >= 0 && bin < level.length; bin += step) {
    const value = valueAt(level, bin);
    if (value > top) return lowest;
    if (value < lowest) lowest = value;
    if (lowest <= top - carrierOverThresholdDb) return lowest;
  }
  return lowest;
}

/**
 * Carriers: bins that are the highest within ±max(RBW, 2 bins), stand 10 dB or more above the threshold, and 10 dB above the
 * saddles beside them.
 * @param sweep a reference.
 * @param floor noise floor that belongs to it.
 * @param marginDb floor margin, dB.
 * @returns indices of the carriers' bins, ascending.
 */
export function findCarriers(sweep: Sweep, floor: NoiseFloor, marginDb: number): number[] {
  const toleranceHz = carrierToleranceHz(sweep);
  const carriers: number[] = [];
  for (let bin = 0; bin < sweep.level.length; bin += 1) {
    const level = valueAt(sweep.level, bin);
    if (valueAt(sweep.level, bin - 1) >= level || valueAt(sweep.level, bin + 1) > level) continue;
    const frequencyHz = valueAt(sweep.frequencyHz, bin);
    if (level < floorAt(floor, frequencyHz, marginDb, 1).thresholdLevel + carrierOverThresholdDb) continue;
    if (highestBin(sweep, frequencyHz, toleranceHz) !== bin) continue;
    if (Math.max(saddleLevel(sweep.level, bin, 1), saddleLevel(sweep.level, bin, -1)) > level - carrierOverThresholdDb) continue;
    carriers.push(bin);
  }
  return carriers;
}

/**
 * The floor of a sweep beside its carriers: bins further than 5 RBW and 5 bins from any.
 * @param sweep a spot or comb sweep.
 * @param carrierHz where carriers stand, Hz.
 * @returns the floor, or null where fewer than 10 bins are left.
 */
export function floorBesideCarriers(sweep: Sweep, carrierHz: readonly number[]): NoiseFloor | null {
  const distanceHz = cleanDistance * Math.max(sweep.settings.rbwHz ?? 0, medianStepHz(sweep.frequencyHz));
  const isClean = new Uint8Array(sweep.level.length).fill(1);
  for (const frequencyHz of carrierHz) {
    const { from, to } = binsAround(sweep.frequencyHz, frequencyHz, distanceHz);
    isClean.fill(0, from, to);
  }
  const frequencies = sweep.frequencyHz.filter((_, bin) => isClean[bin] === 1);
  if (frequencies.length < 10) return null;
  return noiseFloorOf(frequencies, sweep.level.filter((_, bin) => isClean[bin] === 1));
}
