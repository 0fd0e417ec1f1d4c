import type { Requirement } from '@leeside/contracts/requirements';
import type { Database } from './open-database.js';
import { findRequirement } from './requirement-store.js';
import { listLevels, type KeptLevel } from './level-store.js';
import { listTraces, type KeptTrace } from './trace-store.js';

/** Everything but the numbers that the curves of a session are computed from. */
export interface SessionMeasurements {
  readonly traces: readonly KeptTrace[];
  readonly levels: readonly KeptLevel[];
  readonly requirement: Requirement | null;
  readonly floorMarginDb: number;
  readonly driftLimitDb: number;
  /** SHA-256 and name of each trace's file. */
  readonly files: ReadonlyMap<string, { fileId: string; sha256: string; name: string }>;
}

export async function readSessionMeasurements(db: Database, labId: string, sessionId: string): Promise<SessionMeasurements | null> {
  const session: { requirement_id: string | null; floor_margin_db: number; drift_limit_db: number } | undefined = await db('sessions').join('labs', 'labs.id', 'sessions.lab_id')
    .where({ 'sessions.id': sessionId, 'sessions.lab_id': labId }).first('requirement_id', 'sessions.floor_margin_db', 'labs.drift_limit_db');
  if (!session) return null;
  const [traces, levels, files] = await Promise.all([
    listTraces(db, labId, sessionId), listLevels(db, labId, sessionId),
    db('files').where({ session_id: sessionId }).select('id', 'sha256', 'name') as Promise<{ id: string; sha256: string; name: string }[]>,
  ]);
  const byId = new Map(files.map((file) => [file.id, file]));
  return {
    traces: traces.filter((trace) => trace.setAside === undefined), levels, floorMarginDb: session.floor_margin_db, driftLimitDb: session.drift_limit_db,
    requirement: session.requirement_id === null ? null : await findRequirement(db, labId, session.requirement_id),
    files: new Map(traces.map((trace) => [trace.id, { fileId: trace.fileId, sha256: byId.get(trace.fileId)?.sha256 ?? '', name: trace.fileName }])),
  };
}
