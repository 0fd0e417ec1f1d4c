import { valueAt } from '@leeside/units/value-at';

function swap(values: Float64Array, one: number, other: number): void {
  const kept = valueAt(values, one);
  values[one] = valueAt(values, other);
  values[other] = kept;
}

/** Puts what is smaller than a pivot before what is larger; answers where both meet. */
function partition(values: Float64Array, low: number, high: number): number {
  const pivot = valueAt(values, (low + high) >> 1);
  let [left, right] = [low, high];
  for (;;) {
    while (valueAt(values, left) < pivot) left += 1;
    while (valueAt(values, right) > pivot) right -= 1;
    if (left >= right) return right;
    swap(values, left, right);
    left += 1;
    right -= 1;
  }
}

/**
 * The value of a given rank, in linear time on the average (selection after Hoare); the order of the values changes.
 * @param values finite numbers, at least one.
 * @param rank 0 for the lowest.
 * @example selectRank(Float64Array.of(3, 1, 2), 1) // 2
 */
export function selectRank(values: Float64Array, rank: number): number {
  let [low, high] = [0, values.length - 1];
  while (low < high) {
    const meeting = partition(values, low, high);
    if (rank <= meeting) high = meeting;
    else low = meeting + 1;
  }
  return valueAt(values, rank);
}
