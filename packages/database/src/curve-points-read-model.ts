import { unpackFloat32, unpackFloat64 } from './numeric-columns.js';
import type { Database } from './open-database.js';
import { indicesForPixels, indicesInWindow, type Window } from './pixel-columns.js';
import type { CurveColumns } from './curve-result-store.js';

interface PointsRow {
  frequency_f64: Buffer;
  attenuation_f32: Buffer;
  at_least_u8: Buffer;
  at_most_f32: Buffer;
  ceiling_f32: Buffer;
  uncertainty_f32: Buffer;
  required_f32: Buffer;
  excess_f32: Buffer;
  reference_f32: Buffer;
  enclosed_f32: Buffer;
  floor_f32: Buffer;
  mean_f32: Buffer;
  spread_f32: Buffer;
}

const noColumns: CurveColumns = {
  frequencyHz: new Float64Array(), attenuationDb: new Float32Array(), atLeast: new Uint8Array(), atMostDb: new Float32Array(), ceilingDb: new Float32Array(), expandedUncertaintyDb: new Float32Array(),
  requiredDb: new Float32Array(), excessDb: new Float32Array(), referenceLevel: new Float32Array(), enclosedLevel: new Float32Array(), floorLevel: new Float32Array(), meanDb: new Float32Array(), spreadDb: new Float32Array(),
};

const columnsOf = (row: PointsRow): CurveColumns => ({
  frequencyHz: unpackFloat64(row.frequency_f64), attenuationDb: unpackFloat32(row.attenuation_f32), atLeast: new Uint8Array(row.at_least_u8), atMostDb: unpackFloat32(row.at_most_f32),
  ceilingDb: unpackFloat32(row.ceiling_f32), expandedUncertaintyDb: unpackFloat32(row.uncertainty_f32), requiredDb: unpackFloat32(row.required_f32), excessDb: unpackFloat32(row.excess_f32),
  referenceLevel: unpackFloat32(row.reference_f32), enclosedLevel: unpackFloat32(row.enclosed_f32), floorLevel: unpackFloat32(row.floor_f32), meanDb: unpackFloat32(row.mean_f32), spreadDb: unpackFloat32(row.spread_f32),
});

function choose(columns: CurveColumns, indices: Uint32Array): CurveColumns {
  const cut = (values: Float32Array): Float32Array => Float32Array.from(indices, (at) => values[at] ?? NaN);
  return {
    frequencyHz: Float64Array.from(indices, (at) => columns.frequencyHz[at] ?? NaN), attenuationDb: cut(columns.attenuationDb), atLeast: Uint8Array.from(indices, (at) => columns.atLeast[at] ?? 0),
    atMostDb: cut(columns.atMostDb), ceilingDb: cut(columns.ceilingDb), expandedUncertaintyDb: cut(columns.expandedUncertaintyDb), requiredDb: cut(columns.requiredDb), excessDb: cut(columns.excessDb),
    referenceLevel: cut(columns.referenceLevel), enclosedLevel: cut(columns.enclosedLevel), floorLevel: cut(columns.floorLevel), meanDb: cut(columns.meanDb), spreadDb: cut(columns.spreadDb),
  };
}

/** Points of a curve in a window, as many as the pixels need (by the attenuation's lowest and highest); null where the lab has no such curve, none where it is not ready. */
export async function readCurvePoints(db: Database, labId: string, curveId: string, window: Window): Promise<CurveColumns | null> {
  const curve: unknown = await db('curves').where({ id: curveId, lab_id: labId }).first('id');
  if (curve === undefined) return null;
  const row: PointsRow | undefined = await db('curve_points').where({ curve_id: curveId, lab_id: labId }).first();
  if (!row) return noColumns;
  const columns = columnsOf(row);
  return choose(columns, indicesForPixels(columns.attenuationDb, indicesInWindow(columns.frequencyHz, window), window.maxPoints));
}

/** Unit of the levels beneath a curve: that of its first input. */
export async function readCurveLevelUnit(db: Database, labId: string, curveId: string): Promise<string> {
  const row: { level_unit: string } | undefined = await db('curves').where({ 'curves.id': curveId, 'curves.lab_id': labId })
    .join('traces', 'traces.session_id', 'curves.session_id').whereRaw("curves.inputs @> jsonb_build_array(jsonb_build_object('traceId', traces.id))").first('traces.level_unit');
  return row?.level_unit ?? 'dBm';
}
