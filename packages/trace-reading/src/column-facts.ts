/** What the numbers of a column show by themselves. */
export interface ColumnFacts {
  readonly isAscending: boolean;
  readonly isDescending: boolean;
  /** 0, 1, 2 … or 1, 2, 3 … */
  readonly isIndex: boolean;
  readonly isConstant: boolean;
  readonly isEmpty: boolean;
  readonly first: number;
  readonly last: number;
  readonly lowest: number;
  readonly highest: number;
  /** Share of steps that rise. */
  readonly risingShare: number;
}

/** Looks at a column once. Cells without a value are passed over. */
export function columnFacts(column: Float64Array): ColumnFacts {
  let [first, last, lowest, highest] = [NaN, NaN, Infinity, -Infinity];
  let [count, rising, falling, unitSteps] = [0, 0, 0, 0];
  for (const value of column) {
    if (Number.isNaN(value)) continue;
    if (count === 0) first = value;
    else if (value > last) {
      rising += 1;
      if (value - last === 1) unitSteps += 1;
    } else if (value < last) falling += 1;
    last = value;
    count += 1;
    if (value < lowest) lowest = value;
    if (value > highest) highest = value;
  }
  const steps = Math.max(0, count - 1);
  return {
    isAscending: steps > 0 && rising === steps, isDescending: steps > 0 && falling === steps, isIndex: steps > 0 && unitSteps === steps && (first === 0 || first === 1), isConstant: count > 0 && lowest === highest,
    isEmpty: count === 0, first, last, lowest, highest, risingShare: steps === 0 ? 0 : rising / steps,
  };
}
