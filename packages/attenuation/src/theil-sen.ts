import { valueAt } from '@leeside/units/value-at';
import { selectRank } from './select-rank.js';

const mostPoints = 2001;
const fewestPoints = 5;

/**
 * Slope of Theil and Sen: the median of the slopes of all pairs with different abscissae. Above 2,001 points it stands on 2,001 evenly
 * chosen ones.
 * @param x abscissae, ascending (log10 f for dB per decade).
 * @param y ordinates of equal length.
 * @returns slope in units of y per unit of x; null for fewer than 5 points.
 * @source R cars data: 3.666667 (computed).
 */
export function theilSenSlope(x: readonly number[], y: readonly number[]): number | null {
  if (x.length < fewestPoints) return null;
  const stride = Math.max(1, (x.length - 1) / (mostPoints - 1));
  const chosen = Array.from({ length: Math.min(x.length, mostPoints) }, (_, at) => Math.round(at * stride));
  const slopes = new Float64Array((chosen.length * (chosen.length - 1)) / 2);
  let count = 0;
  for (let one = 0; one < chosen.length; one += 1) {
    const xOne = x[valueAt(chosen, one)] ?? NaN;
    const yOne = y[valueAt(chosen, one)] ?? NaN;
    for (let other = one + 1; other < chosen.length; other += 1) {
      const run = valueAt(x, valueAt(chosen, other)) - xOne;
      if (run === 0) continue;
      slopes[count] = (valueAt(y, valueAt(chosen, other)) - yOne) / run;
      count += 1;
    }
  }
  if (count === 0) return null;
  const known = slopes.subarray(0, count);
  const upper = selectRank(known, count >> 1);
  return count % 2 === 1 ? upper : (selectRank(known, (count >> 1) - 1) + upper) / 2;
}
