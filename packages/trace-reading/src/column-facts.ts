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

interface Tally {
  first: number;
  last: number;
  lowest: number;
  highest: number;
  count: number;
  rising: number;
  falling: number;
  unitSteps: number;
}

function countStep(tally: Tally, value: number): void {
  if (value > tally.last) tally.rising += 1;
  if (value < tally.last) tally.falling += 1;
  if (value - tally.last === 1) tally.unitSteps += 1;
}

/** Looks at a column once. Cells without a value are passed over. */
export function columnFacts(column: Float64Array): ColumnFacts {
  const tally: Tally = { first: NaN, last: NaN, lowest: Infinity, highest: -Infinity, count: 0, rising: 0, falling: 0, unitSteps: 0 };
  for (const value of column) {
    if (Number.isNaN(value)) continue;
    if (tally.count === 0) tally.first = value;
    else countStep(tally, value);
    tally.last = value;
    tally.count += 1;
    tally.lowest = Math.min(tally.lowest, value);
    tally.highest = Math.max(tally.highest, value);
  }
  const steps = Math.max(0, tally.count - 1);
  const isEvery = (some: number): boolean => steps > 0 && some === steps;
  const { first, last, lowest, highest } = tally;
  return {
    isAscending: isEvery(tally.rising), isDescending: isEvery(tally.falling), isIndex: isEvery(tally.unitSteps) && (first === 0 || first === 1), isConstant: tally.count > 0 && lowest === highest,
    isEmpty: tally.count === 0, first, last, lowest, highest, risingShare: steps === 0 ? 0 : tally.rising / steps,
  };
}
