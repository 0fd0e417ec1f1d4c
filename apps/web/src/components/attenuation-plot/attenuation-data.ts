import type { CurvePointsBody } from '@leeside/contracts/curves';

type Column = (number | null)[];
interface Gap { fromHz: number; toHz: number }

/** Columns on one frequency axis as they are drawn. Breaks are points of their own that hold nothing, so that no line crosses a gap. */
export interface AttenuationColumns {
  frequencyHz: number[];
  exactDb: Column;
  boundDb: Column;
  ceilingDb: Column;
  lowerDb: Column;
  upperDb: Column;
  /** The bound itself, without the exact neighbours that the dashed line starts from. */
  ownBoundDb: Column;
}

const separates = (gap: Gap, beforeHz: number, afterHz: number): boolean => gap.toHz > beforeHz && gap.fromHz < afterHz;

const emptyColumns = (): AttenuationColumns => ({
  frequencyHz: [], exactDb: [], boundDb: [], ceilingDb: [], lowerDb: [], upperDb: [], ownBoundDb: [],
});

function pushBreak(columns: AttenuationColumns, hz: number): void {
  columns.frequencyHz.push(hz);
  for (const column of [columns.exactDb, columns.boundDb, columns.ceilingDb, columns.lowerDb, columns.upperDb, columns.ownBoundDb]) column.push(null);
}

/** The uncertainty lies around an exact value and only below a bound. */
function bandOf(db: number, uncertaintyDb: number | null | undefined, isBound: boolean): [number | null, number | null] {
  if (uncertaintyDb === null || uncertaintyDb === undefined) return [null, null];
  return [db - uncertaintyDb, isBound ? db : db + uncertaintyDb];
}

function pushPoint(columns: AttenuationColumns, points: CurvePointsBody, at: number): void {
  const db = points.attenuationDb[at] ?? NaN;
  const isBound = points.atLeast[at] === true;
  const [lowerDb, upperDb] = bandOf(db, points.expandedUncertaintyDb[at], isBound);
  columns.frequencyHz.push(points.frequencyHz[at] ?? NaN);
  columns.exactDb.push(isBound ? null : db);
  columns.ownBoundDb.push(isBound ? db : null);
  columns.boundDb.push(isBound ? db : null);
  columns.ceilingDb.push(points.ceilingDb[at] ?? null);
  columns.lowerDb.push(lowerDb);
  columns.upperDb.push(upperDb);
}

/** A dashed bound starts at the exact neighbour that it leaves. */
function joinBoundsToExact({ exactDb, boundDb, ownBoundDb }: AttenuationColumns): void {
  exactDb.forEach((db, at) => {
    if (db !== null && ((ownBoundDb[at - 1] ?? null) !== null || (ownBoundDb[at + 1] ?? null) !== null)) boundDb[at] = db;
  });
}

/** Shapes the points of a curve for drawing. */
export function attenuationColumns(points: CurvePointsBody, gaps: readonly Gap[]): AttenuationColumns {
  const columns = emptyColumns();
  points.frequencyHz.forEach((hz, at) => {
    const beforeHz = points.frequencyHz[at - 1];
    if (beforeHz !== undefined && gaps.some((gap) => separates(gap, beforeHz, hz))) pushBreak(columns, Math.sqrt(beforeHz * hz));
    pushPoint(columns, points, at);
  });
  joinBoundsToExact(columns);
  return columns;
}
