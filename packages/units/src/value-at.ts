/**
 * A value of a column; NaN where there is none at that place.
 * @param column numbers of any kind.
 * @param place index from 0.
 * @example valueAt(Float32Array.of(1.5), 0) // 1.5
 */
export function valueAt(column: ArrayLike<number>, place: number): number {
  return column[place] ?? NaN;
}
