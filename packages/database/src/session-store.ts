import type { Session, SessionProgress, SessionSummary } from '@leeside/contracts/sessions';
import type { FileState } from '@leeside/contracts/file-states';
import type { Database } from './open-database.js';
import { pageFrom, readCursor, type Page } from './page-cursor.js';

interface SessionRow {
  id: string;
  title: string;
  held_on: string;
  impedance_ohm: number;
  requirement_id: string | null;
  requirement_name: string | null;
  floor_margin_db: number;
  notes: string | null;
  created_at: string;
  created_by_name: string;
  progress: SessionProgress;
}

/** How far a session is, in one statement, so that no moment shows rest where there is none. */
const progressSql = `(select json_build_object(
    'waiting', count(*) filter (where state = 'waiting'), 'reading', count(*) filter (where state = 'reading'),
    'read', count(*) filter (where state = 'read'), 'needsAnswer', count(*) filter (where state = 'needs answer'),
    'refused', count(*) filter (where state = 'refused'),
    'curvesPending', (select count(*) from curves where session_id = sessions.id and state = 'pending'),
    'curvesReady', (select count(*) from curves where session_id = sessions.id and state = 'ready'))
  from files where session_id = sessions.id and set_aside_at is null) as progress`;

const sessions = (db: Database, labId: string) => db('sessions').leftJoin('requirements', 'requirements.id', 'sessions.requirement_id').join('people', 'people.id', 'sessions.created_by')
  .where('sessions.lab_id', labId).select('sessions.*', 'requirements.name as requirement_name', 'people.name as created_by_name', db.raw(progressSql));

const summaryOf = (row: SessionRow): SessionSummary => ({
  id: row.id, title: row.title, heldOn: row.held_on, impedanceOhm: row.impedance_ohm, requirementId: row.requirement_id, requirementName: row.requirement_name,
  floorMarginDb: row.floor_margin_db, notes: row.notes, createdAt: row.created_at, createdByName: row.created_by_name, progress: row.progress,
});

export async function listSessions(db: Database, labId: string, page: { limit: number; cursor?: string | undefined }): Promise<Page<SessionSummary>> {
  const query = sessions(db, labId).orderBy([{ column: 'held_on', order: 'desc' }, { column: 'sessions.created_at', order: 'desc' }, { column: 'sessions.id', order: 'desc' }]).limit(page.limit + 1);
  const after = readCursor(page.cursor, 3);
  if (after) query.whereRaw('(held_on, sessions.created_at, sessions.id) < (?::date, ?::timestamptz, ?::uuid)', after);
  const rows: SessionRow[] = await query;
  return pageFrom(rows, page.limit, summaryOf, (row) => [row.held_on, row.created_at, row.id]);
}

export async function findSession(db: Database, labId: string, id: string): Promise<Session | null> {
  const row: SessionRow | undefined = await sessions(db, labId).where('sessions.id', id).first();
  if (!row) return null;
  const files: { id: string; name: string; state: FileState; setAsideAt: string | null }[] = await db('files').where({ session_id: id }).orderBy('upload_order').select('id', 'name', 'state', 'set_aside_at as setAsideAt');
  return { ...summaryOf(row), files };
}

/** Whether a lab has such a session. */
export async function sessionExists(db: Database, labId: string, id: string): Promise<boolean> {
  const row: unknown = await db('sessions').where({ id, lab_id: labId }).first('id');
  return row !== undefined;
}

export async function readProgress(db: Database, sessionId: string): Promise<SessionProgress | null> {
  const row: { progress: SessionProgress } | undefined = await db('sessions').where({ id: sessionId }).first(db.raw(progressSql));
  return row?.progress ?? null;
}

export interface NewSession {
  readonly title: string;
  readonly heldOn: string;
  readonly impedanceOhm?: number | undefined;
  readonly requirementId?: string | undefined;
  readonly floorMarginDb?: number | undefined;
  readonly notes?: string | undefined;
}

/** Opens a session; the lab's own floor margin stands where none is given. */
export async function createSession(db: Database, { labId, personId }: { labId: string; personId: string }, session: NewSession): Promise<string> {
  const margin = session.floorMarginDb ?? db.raw('(select floor_margin_db from labs where id = ?)', [labId]);
  const [row]: { id: string }[] = await db('sessions').insert({
    lab_id: labId, title: session.title, held_on: session.heldOn, impedance_ohm: session.impedanceOhm ?? 50, requirement_id: session.requirementId ?? null,
    floor_margin_db: margin, notes: session.notes ?? null, created_by: personId,
  }).returning('id');
  if (!row) throw new Error('The session was not kept.');
  return row.id;
}
