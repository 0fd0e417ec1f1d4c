import { valueAt } from '@leeside/units/value-at';

/** First index whose frequency is not below the bound. */
function firstNotBelow(axisHz: Float64Array, boundHz: number): number {
  let low = 0;
  let high = axisHz.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (valueAt(axisHz, middle) < boundHz) low = middle + 1;
    else high = middle;
  }
  return low;
}

export interface Window {
  readonly fromHz?: number | undefined;
  readonly toHz?: number | undefined;
  readonly maxPoints?: number | undefined;
}

/** Indices from `from` to `to` (exclusive) that lie in the window. */
export function indicesInWindow(axisHz: Float64Array, { fromHz, toHz }: Window): { from: number; to: number } {
  const from = fromHz === undefined ? 0 : firstNotBelow(axisHz, fromHz);
  const beyond = toHz === undefined ? axisHz.length : firstNotBelow(axisHz, toHz);
  const to = toHz !== undefined && axisHz[beyond] === toHz ? beyond + 1 : beyond;
  return { from, to: Math.max(from, to) };
}

/**
 * The points that a plot needs: all, or of each of maxPoints/2 equal stretches the lowest and the highest value, at their own places.
 * A peak is never lost.
 * @param values the column that decides what is lowest and highest; NaN is passed over.
 * @param from first index, `to` one past the last.
 * @param maxPoints at most this many indices.
 * @returns ascending indices.
 */
export function indicesForPixels(values: Float32Array, { from, to }: { from: number; to: number }, maxPoints: number | undefined): Uint32Array {
  const count = to - from;
  if (maxPoints === undefined || count <= maxPoints) return Uint32Array.from({ length: count }, (_, at) => from + at);
  const columns = Math.max(1, Math.floor(maxPoints / 2));
  const chosen: number[] = [];
  for (let column = 0; column < columns; column += 1) {
    const start = from + Math.floor((column * count) / columns);
    const end = from + Math.floor(((column + 1) * count) / columns);
    let lowest = start;
    let highest = start;
    for (let at = start + 1; at < end; at += 1) {
      if (!(valueAt(values, at) >= valueAt(values, lowest))) lowest = at;
      if (!(valueAt(values, at) <= valueAt(values, highest))) highest = at;
    }
    chosen.push(Math.min(lowest, highest));
    if (lowest !== highest) chosen.push(Math.max(lowest, highest));
  }
  return Uint32Array.from(chosen);
}
