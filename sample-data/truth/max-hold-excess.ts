/**
 * How far the median of a max-held reading of a carrier in noise lies over the true carrier, dB: rows by S/N in dB, columns by number of looks.
 * Computed outside the project from the non-central χ² distribution with two degrees of freedom.
 */
const looksOfColumns = [1, 10, 100, 1000] as const;
const rows: readonly [overNoiseDb: number, excessDb: readonly [number, number, number, number]][] = [
  [0, [1.894, 6.962, 9.204, 10.608]],
  [6, [0.524, 3.98, 5.655, 6.75]],
  [10, [0.214, 2.649, 3.92, 4.78]],
  [20, [0.022, 0.894, 1.411, 1.786]],
  [30, [0.002, 0.288, 0.467, 0.602]],
];

function between(abscissae: readonly number[], ordinates: readonly number[], at: number): number {
  const last = abscissae.length - 1;
  const clamped = Math.min(Math.max(at, abscissae[0] ?? 0), abscissae[last] ?? 0);
  const above = Math.max(1, abscissae.findIndex((abscissa) => abscissa >= clamped));
  const left = abscissae[above - 1] ?? 0;
  const right = abscissae[above] ?? left;
  const low = ordinates[above - 1] ?? 0;
  return low + ((ordinates[above] ?? low) - low) * ((clamped - left) / (right - left));
}

/**
 * Median excess of a max-held carrier, between the table's rows and columns straight in dB and in the logarithm of the looks.
 * @param overNoiseDb true signal over mean noise power, dB; held to 0 to 30.
 * @param looks looks held; held to 1 to 1000.
 * @example maxHoldExcessDb(20, 10) // 0.894
 */
export function maxHoldExcessDb(overNoiseDb: number, looks: number): number {
  const decades = looksOfColumns.map(Math.log);
  const byRow = rows.map(([, excessDb]) => between(decades, excessDb, Math.log(looks)));
  return between(rows.map(([rowDb]) => rowDb), byRow, overNoiseDb);
}
