import { valueAt } from '@leeside/units/value-at';

/**
 * Index of the first frequency that is not below the given one.
 * @param axisHz ascending frequencies, Hz.
 * @param frequencyHz sought, Hz.
 * @returns 0 to axisHz.length (the latter where all lie below).
 * @example firstNotBelow(Float64Array.of(1, 2, 3), 2) // 1
 */
export function firstNotBelow(axisHz: Float64Array, frequencyHz: number): number {
  let low = 0;
  let high = axisHz.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (valueAt(axisHz, middle) < frequencyHz) low = middle + 1;
    else high = middle;
  }
  return low;
}

/**
 * Index of the frequency that lies nearest.
 * @param axisHz ascending frequencies, Hz, at least one.
 * @param frequencyHz sought, Hz.
 * @example nearestIndex(Float64Array.of(1, 2, 3), 2.2) // 1
 */
export function nearestIndex(axisHz: Float64Array, frequencyHz: number): number {
  const after = Math.min(firstNotBelow(axisHz, frequencyHz), axisHz.length - 1);
  if (after === 0) return 0;
  return frequencyHz - valueAt(axisHz, after - 1) < valueAt(axisHz, after) - frequencyHz ? after - 1 : after;
}

/**
 * The usual distance of two bins: the median of at most 1,001 steps spread over the axis.
 * @param axisHz ascending frequencies, Hz.
 * @returns Hz; 0 for a single point.
 */
export function medianStepHz(axisHz: Float64Array): number {
  const count = axisHz.length - 1;
  if (count < 1) return 0;
  const stride = Math.max(1, Math.floor(count / 1001));
  const steps: number[] = [];
  for (let at = 0; at < count; at += stride) steps.push(valueAt(axisHz, at + 1) - valueAt(axisHz, at));
  steps.sort((one, other) => one - other);
  return valueAt(steps, steps.length >> 1);
}
