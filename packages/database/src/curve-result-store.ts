import type { Database } from './open-database.js';
import { packFloat32, packFloat64 } from './numeric-columns.js';

/** A curve that waits to be computed; a result is kept only while `attempt` still is the curve's. */
export interface PendingCurve {
  readonly id: string;
  readonly attempt: number;
  readonly sampleId: string | null;
  readonly subjectTraceId: string | null;
  readonly condition: string;
}

export async function listPendingCurves(db: Database, labId: string, sessionId: string): Promise<PendingCurve[]> {
  const rows: { id: string; attempt: number; sample_id: string | null; subject_trace_id: string | null; condition: string }[] =
    await db('curves').where({ lab_id: labId, session_id: sessionId, state: 'pending' }).orderBy('id');
  return rows.map((row) => ({ id: row.id, attempt: row.attempt, sampleId: row.sample_id, subjectTraceId: row.subject_trace_id, condition: row.condition }));
}

export interface CurveColumns {
  readonly frequencyHz: Float64Array;
  readonly attenuationDb: Float32Array;
  readonly atLeast: Uint8Array;
  readonly atMostDb: Float32Array;
  readonly ceilingDb: Float32Array;
  readonly expandedUncertaintyDb: Float32Array;
  readonly requiredDb: Float32Array;
  readonly excessDb: Float32Array;
  readonly referenceLevel: Float32Array;
  readonly enclosedLevel: Float32Array;
  readonly floorLevel: Float32Array;
  readonly meanDb: Float32Array;
  readonly spreadDb: Float32Array;
}

interface LowestValue {
  readonly frequencyHz: number;
  readonly attenuationDb: number;
  readonly atLeast: boolean;
  readonly atMostDb: number | null;
}

export interface BandResult {
  readonly kind: 'decade' | 'segment';
  readonly fromHz: number;
  readonly toHz: number;
  readonly lowest: LowestValue | null;
  readonly medianDb: number | null;
  readonly medianAtLeast: boolean;
  readonly q10Db: number | null;
  readonly q10AtLeast: boolean;
  readonly boundShare: number;
  readonly slopeDbPerDecade: number | null;
}

export interface ComputedCurve {
  readonly style: string;
  readonly points: CurveColumns;
  readonly bands: readonly BandResult[];
  readonly lowest: LowestValue | null;
  readonly outcome: string | null;
  readonly decidedAtHz: number | null;
  readonly gaps: unknown;
  readonly notMeasured: unknown;
  readonly doubts: unknown;
  readonly inputs: unknown;
  readonly pairs: unknown;
  readonly parameters: unknown;
  readonly floorSource: string;
  readonly driftDb: number | null;
  readonly analysisVersion: string;
  readonly inputHash: string;
}

const json = (value: unknown): string => JSON.stringify(value);

async function writePoints(trx: Database, labId: string, curveId: string, points: CurveColumns): Promise<void> {
  const columns = {
    frequency_f64: packFloat64(points.frequencyHz), attenuation_f32: packFloat32(points.attenuationDb), at_least_u8: Buffer.from(points.atLeast), at_most_f32: packFloat32(points.atMostDb),
    ceiling_f32: packFloat32(points.ceilingDb), uncertainty_f32: packFloat32(points.expandedUncertaintyDb), required_f32: packFloat32(points.requiredDb), excess_f32: packFloat32(points.excessDb),
    reference_f32: packFloat32(points.referenceLevel), enclosed_f32: packFloat32(points.enclosedLevel), floor_f32: packFloat32(points.floorLevel), mean_f32: packFloat32(points.meanDb), spread_f32: packFloat32(points.spreadDb),
  };
  await trx('curve_points').insert({ curve_id: curveId, lab_id: labId, ...columns }).onConflict('curve_id').merge(columns);
}

async function writeBands(trx: Database, labId: string, curveId: string, bands: readonly BandResult[]): Promise<void> {
  await trx('bands').where({ curve_id: curveId }).delete();
  if (bands.length === 0) return;
  const origin: { sample_id: string | null; lot_id: string | null; design_id: string | null } | undefined = await trx('curves').leftJoin('samples', 'samples.id', 'curves.sample_id').leftJoin('lots', 'lots.id', 'samples.lot_id')
    .where('curves.id', curveId).first('curves.sample_id', 'samples.lot_id', trx.raw('coalesce(samples.design_id, lots.design_id) as design_id'));
  await trx('bands').insert(bands.map((band, place) => ({ curve_id: curveId, place, lab_id: labId, ...(origin ?? {}), ...bandColumns(band) })));
}

function bandColumns(band: BandResult): Record<string, unknown> {
  const { lowest } = band;
  return {
    kind: band.kind, from_hz: band.fromHz, to_hz: band.toHz, lowest: lowest && json(lowest), lowest_db: lowest && lowest.attenuationDb, at_least: lowest && lowest.atLeast,
    median_db: band.medianDb, median_at_least: band.medianAtLeast, q10_db: band.q10Db, q10_at_least: band.q10AtLeast, bound_share: band.boundShare, slope_db_per_decade: band.slopeDbPerDecade,
  };
}

/** Keeps a computed curve as a new revision; false where the curve was marked anew meanwhile, and nothing was changed. */
export async function keepCurve(trx: Database, labId: string, { id, attempt }: Pick<PendingCurve, 'id' | 'attempt'>, curve: ComputedCurve): Promise<boolean> {
  const kept = await trx('curves').where({ id, lab_id: labId, state: 'pending', attempt }).update({
    state: 'ready', failure: null, revision: trx.raw('revision + 1'), style: curve.style, point_count: curve.points.frequencyHz.length, outcome: curve.outcome, decided_at_hz: curve.decidedAtHz,
    lowest: curve.lowest && json(curve.lowest), doubts: json(curve.doubts), gaps: json(curve.gaps), not_measured: json(curve.notMeasured), inputs: json(curve.inputs), pairs: json(curve.pairs),
    parameters: json(curve.parameters), floor_source: curve.floorSource, drift_db: curve.driftDb, analysis_version: curve.analysisVersion, input_hash: curve.inputHash, computed_at: trx.fn.now(),
  });
  if (kept !== 1) return false;
  await writePoints(trx, labId, id, curve.points);
  await writeBands(trx, labId, id, curve.bands);
  return true;
}

/** Says why there is no curve; false where it was marked anew meanwhile. */
export async function failCurve(trx: Database, labId: string, { id, attempt }: Pick<PendingCurve, 'id' | 'attempt'>, reason: { failure: string; doubts: unknown }): Promise<boolean> {
  const failed = await trx('curves').where({ id, lab_id: labId, state: 'pending', attempt }).update({
    state: 'failed', failure: reason.failure, doubts: json(reason.doubts), style: null, point_count: 0, outcome: null, decided_at_hz: null, lowest: null, gaps: '[]', not_measured: '[]', inputs: '[]', pairs: '[]',
    floor_source: null, drift_db: null, computed_at: trx.fn.now(),
  });
  if (failed !== 1) return false;
  await trx('curve_points').where({ curve_id: id }).delete();
  await trx('bands').where({ curve_id: id }).delete();
  return true;
}
