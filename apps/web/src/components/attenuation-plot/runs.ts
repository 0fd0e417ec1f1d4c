export interface Run { first: number; last: number }

/** The unbroken stretches of a column: from the first to the last index of each. */
export function runsOf(column: readonly (number | null)[]): Run[] {
  const runs: Run[] = [];
  column.forEach((value, at) => {
    if (value === null) return;
    const current = runs.at(-1);
    if (current && current.last === at - 1) current.last = at;
    else runs.push({ first: at, last: at });
  });
  return runs;
}
