import { valueAt } from '@leeside/units/value-at';
import type { KeptAxis } from './frequency-axis.js';

const binCounts = [1024, 4096, 16_384, 65_536] as const;
const smallestSweep = 4096;

/** Bin counts that the pyramid of a sweep holds. */
export function pyramidLevels(pointCount: number): number[] {
  return pointCount <= smallestSweep ? [] : binCounts.filter((bins) => bins * 2 <= pointCount);
}

/** Minimum and maximum of each bin, level after level: bin i of b holds points ⌊i·n/b⌋ to ⌊(i+1)·n/b⌋ − 1. Null for short sweeps. */
export function buildPyramid(level: Float32Array): Float32Array | null {
  const levels = pyramidLevels(level.length);
  if (levels.length === 0) return null;
  const pyramid = new Float32Array(levels.reduce((sum, bins) => sum + 2 * bins, 0));
  let place = 0;
  for (const bins of levels) {
    for (let bin = 0; bin < bins; bin += 1) {
      const start = Math.floor((bin * level.length) / bins);
      const end = Math.floor(((bin + 1) * level.length) / bins);
      let lowest = Infinity;
      let highest = -Infinity;
      for (let at = start; at < end; at += 1) {
        const value = valueAt(level, at);
        if (value < lowest) lowest = value;
        if (value > highest) highest = value;
      }
      pyramid[place] = lowest;
      pyramid[place + 1] = highest;
      place += 2;
    }
  }
  return pyramid;
}

/** The coarsest level that still gives a window its columns; null where the points themselves are needed. */
export function levelForWindow(pointCount: number, windowPoints: number, columns: number): { bins: number; byteOffset: number } | null {
  let byteOffset = 0;
  for (const bins of pyramidLevels(pointCount)) {
    if ((bins * windowPoints) / pointCount >= columns) return { bins, byteOffset };
    byteOffset += bins * 8;
  }
  return null;
}

/** Whether an index of an evenly spaced axis can be told without reading it. */
export function isEven(axis: Pick<KeptAxis, 'stepHz'>): axis is { stepHz: number } {
  return axis.stepHz !== null;
}
