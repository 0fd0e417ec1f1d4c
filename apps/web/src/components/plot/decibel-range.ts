export interface DecibelRange { least: number; most: number }

/** The lowest and highest finite value over several columns; null where there is none. */
export function extentOf(columns: readonly ArrayLike<number | null>[]): DecibelRange | null {
  let least = Infinity;
  let most = -Infinity;
  for (const column of columns) {
    for (let at = 0; at < column.length; at += 1) {
      const value = column[at];
      if (typeof value !== 'number' || !Number.isFinite(value)) continue;
      if (value < least) least = value;
      if (value > most) most = value;
    }
  }
  return least <= most ? { least, most } : null;
}

/** A range that holds all values with some air, ending at whole tens. */
export function decibelRange(columns: readonly ArrayLike<number | null>[], airBelowDb = 6, airAboveDb = 4): DecibelRange {
  const extent = extentOf(columns);
  if (!extent) return { least: 0, most: 100 };
  const least = Math.floor((extent.least - airBelowDb) / 10) * 10;
  const most = Math.ceil((extent.most + airAboveDb) / 10) * 10;
  return most - least >= 20 ? { least, most } : { least: least - 10, most: most + 10 };
}

/** Ticks at 5, 10, 20 or more dB, as many as fit. */
export function decibelTicks({ least, most }: DecibelRange, fit: number): number[] {
  const step = [5, 10, 20, 50, 100].find((candidate) => (most - least) / candidate <= fit) ?? 200;
  const first = Math.ceil(least / step) * step;
  return Array.from({ length: Math.floor((most - first) / step) + 1 }, (_, at) => first + at * step);
}
