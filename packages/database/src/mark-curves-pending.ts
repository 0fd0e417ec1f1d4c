import type { Database } from './open-database.js';

/** Which curves a session should have: one a sample and condition, one for each enclosed trace without a sample, one for typed levels. */
const wantedSql = `
  select traces.lab_id, traces.session_id, sample_id, case when sample_id is null then traces.id end as subject_trace_id, condition
  from traces join files on files.id = traces.file_id
  where traces.session_id = :sessionId and role = 'enclosed' and set_aside is null and files.set_aside_at is null
  union
  select lab_id, session_id, sample_id, null, condition from typed_levels where session_id = :sessionId and role = 'enclosed'`;

/** Only curves of these samples, or of these traces, are touched; null is all of the session. */
export interface AffectedCurves {
  readonly sampleIds: readonly string[];
  readonly traceIds: readonly string[];
}

/**
 * Marks the curves concerned by a change as pending, in the transaction of the change: there is no moment in which a session seems at
 * rest while a curve is due. Curves that should no longer be go; new ones come. A result computed for an older attempt never lands.
 * The work is announced unless files of the session are still to be read: the last of them announces it.
 */
export async function markCurvesPending(trx: Database, { labId, sessionId }: { labId: string; sessionId: string }, affected: AffectedCurves | null): Promise<void> {
  await trx('sessions').where({ id: sessionId, lab_id: labId }).forNoKeyUpdate().first('id');
  await trx.raw(`
    delete from curves using (select 1) as once
    where curves.session_id = :sessionId and not exists (
      select 1 from (${wantedSql}) as wanted where wanted.sample_id is not distinct from curves.sample_id
        and wanted.subject_trace_id is not distinct from curves.subject_trace_id and wanted.condition = curves.condition)`, { sessionId });
  const chosen = affected === null ? 'true' : '(sample_id = any(:sampleIds::uuid[]) or subject_trace_id = any(:traceIds::uuid[]) or (sample_id is null and subject_trace_id is null))';
  await trx.raw(`
    insert into curves (lab_id, session_id, sample_id, subject_trace_id, condition)
    select lab_id, session_id, sample_id, subject_trace_id, condition from (${wantedSql}) as wanted where ${chosen}
    on conflict (session_id, sample_id, subject_trace_id, condition)
    do update set state = 'pending', attempt = curves.attempt + 1, marked_at = now()`, { sessionId, sampleIds: [...(affected?.sampleIds ?? [])], traceIds: [...(affected?.traceIds ?? [])] });
  await announcePendingCurves(trx, { labId, sessionId });
}

/** Announces the session's pending curves, unless a file is still to be read or the work stands announced already. */
export async function announcePendingCurves(trx: Database, { labId, sessionId }: { labId: string; sessionId: string }): Promise<void> {
  await trx.raw(`
    insert into outbox (lab_id, kind, session_id)
    select :labId, 'compute-curves', :sessionId
    where exists (select 1 from curves where session_id = :sessionId and state = 'pending')
      and not exists (select 1 from files where session_id = :sessionId and state in ('waiting', 'reading') and set_aside_at is null)`, { labId, sessionId });
}
