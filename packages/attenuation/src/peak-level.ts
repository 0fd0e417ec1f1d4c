import { valueAt } from '@leeside/units/value-at';
import type { Sweep } from '@leeside/trace-reading/sweep';

/**
 * The highest level of a sweep and where it stands; the first of equals.
 * @param sweep any sweep.
 * @returns frequency in Hz, level in the sweep's unit.
 */
export function peakOf(sweep: Sweep): { frequencyHz: number; level: number } {
  let highest = 0;
  for (let bin = 1; bin < sweep.level.length; bin += 1) if (valueAt(sweep.level, bin) > valueAt(sweep.level, highest)) highest = bin;
  return { frequencyHz: valueAt(sweep.frequencyHz, highest), level: valueAt(sweep.level, highest) };
}
