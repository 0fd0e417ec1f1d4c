/** Speed of light in vacuum, m/s (exact). */
export const lightMPerS = 299_792_458;

/** An enclosure's inside: length, width and depth in m. */
export type InsideSizeM = readonly [number, number, number];

const largestIndex = 6;

/**
 * Resonances of an empty box with conducting walls, f = (c/2)·√((m/a)² + (n/b)² + (p/d)²), at most one index 0.
 * @param insideSizeM length, width, depth in m.
 * @param upToHz only modes up to here.
 * @returns frequencies in Hz, ascending, each once.
 * @example cavityModesHz([0.3, 0.12, 0.3], 8e8) // [706 617 668]
 */
export function cavityModesHz([lengthM, widthM, depthM]: InsideSizeM, upToHz: number): number[] {
  const modes = new Set<number>();
  const indices = Array.from({ length: largestIndex + 1 }, (_, index) => index);
  for (const m of indices) for (const n of indices) for (const p of indices) {
    if ([m, n, p].filter((index) => index === 0).length > 1) continue;
    const frequencyHz = (lightMPerS / 2) * Math.hypot(m / lengthM, n / widthM, p / depthM);
    if (frequencyHz <= upToHz) modes.add(Math.round(frequencyHz));
  }
  return [...modes].sort((first, second) => first - second);
}
