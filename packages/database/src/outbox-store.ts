import type { JobKind } from '@leeside/contracts/jobs';
import type { Database } from './open-database.js';
import { staleAfterSeconds } from './file-reading-store.js';

export interface OutboxRow {
  readonly id: number;
  readonly labId: string;
  readonly kind: JobKind;
  readonly sessionId: string;
  readonly fileId: string | null;
}

/**
 * Hands unsent rows to `send` and marks them sent in one transaction; rows that another relay holds are passed over. Where `send` fails,
 * the rows stay unsent.
 * @returns how many rows were sent.
 */
export async function relayOutbox(db: Database, limit: number, send: (rows: readonly OutboxRow[]) => Promise<void>): Promise<number> {
  return db.transaction(async (trx) => {
    const rows: { id: number; lab_id: string; kind: JobKind; session_id: string; file_id: string | null }[] = await trx('outbox').whereNull('sent_at').orderBy('id').limit(limit).forUpdate().skipLocked();
    if (rows.length === 0) return 0;
    await send(rows.map((row) => ({ id: row.id, labId: row.lab_id, kind: row.kind, sessionId: row.session_id, fileId: row.file_id })));
    await trx('outbox').whereIn('id', rows.map((row) => row.id)).update({ sent_at: trx.fn.now() });
    return rows.length;
  });
}

/**
 * Announces again what got lost on the way: files and curves that are not final and show no sign of life, and are not announced already.
 * @returns how many rows were added.
 */
export async function announceLostWork(db: Database, lostAfterSeconds: number): Promise<number> {
  const { rowCount: files }: { rowCount: number } = await db.raw(`
    insert into outbox (lab_id, kind, session_id, file_id)
    select lab_id, 'read-files', session_id, id from files
    where ((state = 'waiting' and heartbeat_at < now() - make_interval(secs => :lost)) or (state = 'reading' and heartbeat_at < now() - make_interval(secs => :stale)))
      and not exists (select 1 from outbox where outbox.file_id = files.id and (sent_at is null or sent_at > now() - make_interval(secs => :lost)))`, { lost: lostAfterSeconds, stale: staleAfterSeconds });
  const { rowCount: curves }: { rowCount: number } = await db.raw(`
    insert into outbox (lab_id, kind, session_id)
    select distinct lab_id, 'compute-curves', session_id from curves
    where state = 'pending' and marked_at < now() - make_interval(secs => :lost)
      and not exists (select 1 from files where files.session_id = curves.session_id and files.state in ('waiting', 'reading') and set_aside_at is null)
      and not exists (select 1 from outbox where outbox.session_id = curves.session_id and kind = 'compute-curves' and (sent_at is null or sent_at > now() - make_interval(secs => :lost)))`, { lost: lostAfterSeconds });
  return files + curves;
}

/** Forgets rows that were sent more than a day ago. */
export async function forgetSentRows(db: Database): Promise<void> {
  await db('outbox').whereRaw("sent_at < now() - interval '1 day'").delete();
}
