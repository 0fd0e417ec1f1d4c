import { valueAt } from '@leeside/units/value-at';
import { log10Of } from '@leeside/units/logarithm';
import { firstNotBelow } from './axis-search.js';

/** How far beyond an end a frequency may lie because one of the two files rounded it: a hundredth of a step. */
const roundingShare = 0.01;

/**
 * Level at another frequency: linear in dB over log f, equation (8); never beyond the ends nor across a stretch without readings.
 * @param axisHz ascending frequencies, Hz.
 * @param level levels there, dB or dBm.
 * @param frequencyHz wanted, Hz.
 * @param widestHz the widest distance of two readings between which a straight line may stand.
 * @returns the level, or NaN where the readings do not cover the frequency.
 * @example interpolateLevel(Float64Array.of(1e6, 1e8), Float32Array.of(0, -20), 1e7, 1e9) // −10
 */
export function interpolateLevel(axisHz: Float64Array, level: Float32Array, frequencyHz: number, widestHz: number): number {
  const after = firstNotBelow(axisHz, frequencyHz);
  const last = axisHz.length - 1;
  if (after <= last && axisHz[after] === frequencyHz) return valueAt(level, after);
  const nearStart = after === 0;
  if (nearStart || after > last) {
    const end = nearStart ? 0 : last;
    const neighbour = valueAt(axisHz, nearStart ? Math.min(1, last) : Math.max(0, last - 1));
    const reach = roundingShare * Math.abs(valueAt(axisHz, end) - neighbour);
    return Math.abs(frequencyHz - valueAt(axisHz, end)) <= reach ? valueAt(level, end) : NaN;
  }
  const lowHz = valueAt(axisHz, after - 1);
  const highHz = valueAt(axisHz, after);
  if (highHz - lowHz > widestHz) return NaN;
  const share = lowHz > 0 ? (log10Of(frequencyHz) - log10Of(lowHz)) / (log10Of(highHz) - log10Of(lowHz)) : (frequencyHz - lowHz) / (highHz - lowHz);
  return valueAt(level, after - 1) * (1 - share) + valueAt(level, after) * share;
}
