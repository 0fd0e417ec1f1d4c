import { valueAt } from '@leeside/units/value-at';

/**
 * Running median of a window that is kept as an ordered list: insertion by binary search, O(n·w) moves of a small typed array,
 * which the processor does in one copy.
 */
function placeOf(window: Float32Array, length: number, value: number): number {
  let low = 0;
  let high = length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (valueAt(window, middle) < value) low = middle + 1;
    else high = middle;
  }
  return low;
}

/**
 * The value of a given rank in a window that glides over the levels; near the ends the window keeps its width and leans inward.
 * @param level levels in any unit, finite.
 * @param width bins in the window, ≥ 1; a wider one than the trace takes all of it.
 * @param quantile 0 (lowest) to 1 (highest); 0.5 is the median (lower middle of an even window).
 * @returns one value a bin, in the unit of the levels.
 * @example runningQuantile(Float32Array.of(1, 9, 2), 3, 0.5) // 2, 2, 2
 */
export function runningQuantile(level: Float32Array, width: number, quantile: number): Float32Array {
  const count = level.length;
  const size = Math.min(Math.max(1, Math.floor(width)), count);
  const rank = Math.min(size - 1, Math.max(0, Math.ceil(quantile * size) - 1));
  const window = Float32Array.from(level.subarray(0, size)).sort();
  const result = new Float32Array(count);
  const half = size >> 1;
  let start = 0;
  for (let bin = 0; bin < count; bin += 1) {
    const wanted = Math.min(Math.max(bin - half, 0), count - size);
    for (; start < wanted; start += 1) {
      const gone = placeOf(window, size, valueAt(level, start));
      window.copyWithin(gone, gone + 1, size);
      const come = valueAt(level, start + size);
      const place = placeOf(window, size - 1, come);
      window.copyWithin(place + 1, place, size - 1);
      window[place] = come;
    }
    result[bin] = valueAt(window, rank);
  }
  return result;
}
