import type { Curve, CurveSummary } from '@leeside/contracts/curves';
import type { DoubtBody } from '@leeside/contracts/field-schemas';
import type { Database } from './open-database.js';

interface SummaryRow {
  id: string;
  session_id: string;
  session_title: string;
  revision: number;
  sample_id: string | null;
  sample_code: string | null;
  condition: string;
  state: CurveSummary['state'];
  failure: string | null;
  style: CurveSummary['style'];
  point_count: number;
  outcome: CurveSummary['outcome'];
  lowest: CurveSummary['lowest'];
  doubts: DoubtBody[];
}

interface DetailRow extends SummaryRow {
  held_on: string;
  requirement_id: string | null;
  requirement_name: string | null;
  decided_at_hz: number | null;
  gaps: Curve['gaps'];
  not_measured: Curve['notMeasured'];
  inputs: Curve['inputs'];
  floor_source: string | null;
  drift_db: number | null;
  analysis_version: string | null;
  computed_at: string | null;
  bands: Curve['bands'] | null;
}

const summaryOf = (row: SummaryRow): CurveSummary => ({
  id: row.id, sessionId: row.session_id, sessionTitle: row.session_title, revision: row.revision, sampleId: row.sample_id, sampleCode: row.sample_code, condition: row.condition,
  state: row.state, failure: row.failure, style: row.style, pointCount: row.point_count, outcome: row.outcome, lowest: row.lowest, doubts: row.doubts,
});

const curves = (db: Database, labId: string) => db('curves').join('sessions', 'sessions.id', 'curves.session_id').leftJoin('samples', 'samples.id', 'curves.sample_id')
  .leftJoin('requirements', 'requirements.id', 'sessions.requirement_id').where('curves.lab_id', labId)
  .select('curves.*', 'sessions.title as session_title', 'sessions.held_on', 'samples.code as sample_code', 'sessions.requirement_id', 'requirements.name as requirement_name');

/** The curves of a session, by sample and condition. */
export async function listCurves(db: Database, labId: string, sessionId: string): Promise<CurveSummary[]> {
  const rows: SummaryRow[] = await curves(db, labId).where('curves.session_id', sessionId).orderBy(['samples.code', 'curves.condition', 'curves.id']);
  return rows.map(summaryOf);
}

/** The curves of a sample, the latest session first. */
export async function listCurvesOfSample(db: Database, labId: string, sampleId: string): Promise<CurveSummary[]> {
  const rows: SummaryRow[] = await curves(db, labId).where('curves.sample_id', sampleId).orderBy([{ column: 'sessions.held_on', order: 'desc' }, { column: 'curves.condition' }]);
  return rows.map(summaryOf);
}

const bandsSql = `(select json_agg(json_build_object('fromHz', from_hz, 'toHz', to_hz, 'kind', kind, 'lowest', lowest, 'medianDb', median_db, 'medianAtLeast', median_at_least,
  'q10Db', q10_db, 'q10AtLeast', q10_at_least, 'boundShare', bound_share, 'slopeDbPerDecade', slope_db_per_decade) order by place) from bands where curve_id = curves.id) as bands`;

export async function findCurve(db: Database, labId: string, id: string): Promise<Curve | null> {
  const row: DetailRow | undefined = await curves(db, labId).where('curves.id', id).select(db.raw(bandsSql)).first();
  if (!row) return null;
  return {
    ...summaryOf(row), heldOn: row.held_on, requirementId: row.requirement_id, requirementName: row.requirement_name, decidedAtHz: row.decided_at_hz, bands: row.bands ?? [],
    notMeasured: row.not_measured, gaps: row.gaps, floorSource: row.floor_source, driftDb: row.drift_db, inputs: row.inputs, analysisVersion: row.analysis_version, computedAt: row.computed_at,
  };
}
