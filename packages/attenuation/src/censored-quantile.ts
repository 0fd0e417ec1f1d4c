/** A value with its kind: `atLeast` marks a lower bound (right-censored). */
export interface CensoredValue {
  readonly value: number;
  readonly atLeast: boolean;
}

/**
 * Quantile of values among which some are lower bounds, by the product-limit estimate of Kaplan and Meier. Where the survival meets the
 * level exactly, the middle of the flat; where it never falls that far, "at least the largest value".
 * @param values any order.
 * @param quantile 0 < q < 1: 0.5 the median, 0.1 the value that a tenth lies below.
 * @returns null without values.
 * @source Kaplan–Meier; the mid-point rule as the survival package of R applies it (12 values with 4 bounds: median 72.05).
 * @example censoredQuantile([{ value: 40, atLeast: false }, { value: 50, atLeast: true }], 0.9) // { value: 50, atLeast: true }
 */
export function censoredQuantile(values: readonly CensoredValue[], quantile: number): CensoredValue | null {
  const sorted = [...values].sort((one, other) => one.value - other.value || Number(one.atLeast) - Number(other.atLeast));
  const target = 1 - quantile;
  for (const { value, survival, next } of survivalSteps(sorted)) {
    if (survival < target - slack) return { value, atLeast: false };
    if (survival <= target + slack) return { value: next === null ? value : (value + next) / 2, atLeast: false };
  }
  const largest = sorted.at(-1);
  return largest === undefined ? null : { value: largest.value, atLeast: true };
}

const slack = 1e-9;

/** The survival after each exact value, with the exact value that follows. */
function* survivalSteps(sorted: readonly CensoredValue[]): Iterable<{ value: number; survival: number; next: number | null }> {
  let survival = 1;
  for (let at = 0; at < sorted.length;) {
    const value = sorted[at]?.value ?? NaN;
    let after = at;
    let exact = 0;
    for (; sorted[after]?.value === value; after += 1) exact += Number(sorted[after]?.atLeast === false);
    survival *= 1 - exact / (sorted.length - at);
    at = after;
    if (exact > 0) yield { value, survival, next: nextExact(sorted, after) };
  }
}

function nextExact(sorted: readonly CensoredValue[], from: number): number | null {
  for (let at = from; at < sorted.length; at += 1) if (sorted[at]?.atLeast === false) return sorted[at]?.value ?? null;
  return null;
}
