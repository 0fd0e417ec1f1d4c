/**
 * Evenly spaced display points, both ends included.
 * @param points number of points, ≥ 2.
 * @returns Hz, ascending, rounded to whole Hz as analyzers write them.
 * @example frequencyAxisHz(1e6, 3e6, 3) // 1e6, 2e6, 3e6
 */
export function frequencyAxisHz(startHz: number, stopHz: number, points: number): Float64Array {
  return Float64Array.from({ length: points }, (_, point) => Math.round(startHz + ((stopHz - startHz) * point) / (points - 1)));
}
