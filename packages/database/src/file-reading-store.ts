import type { FileBody, UploadFields } from '@leeside/contracts/files';
import type { Database } from './open-database.js';

/** A file that a worker has claimed: only whoever holds this attempt may say what became of it. */
export interface ClaimedFile {
  readonly id: string;
  readonly name: string;
  readonly sha256: string;
  readonly byteCount: number;
  readonly attempt: number;
  readonly fields: UploadFields;
  readonly answers: { questionId: string; choiceId: string }[];
  readonly impedanceOhm: number;
}

interface ClaimedRow {
  id: string;
  name: string;
  sha256: string;
  byte_count: number;
  attempt: number;
  fields: UploadFields;
  answers: { questionId: string; choiceId: string }[];
  impedance_ohm: number;
}

/** A reader that shows no sign of life for this long is taken for dead. */
export const staleAfterSeconds = 15;

/**
 * Claims files that wait, or whose reader died, by compare-and-set: each goes to one worker.
 */
export async function claimFiles(db: Database, labId: string, fileIds: readonly string[]): Promise<ClaimedFile[]> {
  const { rows }: { rows: ClaimedRow[] } = await db.raw(`
    with claimed as (
      update files set state = 'reading', attempt = attempt + 1, heartbeat_at = now()
      where lab_id = ? and id = any(?::uuid[])
        and (state = 'waiting' or (state = 'reading' and heartbeat_at < now() - make_interval(secs => ?)))
      returning *)
    select claimed.*, sessions.impedance_ohm from claimed join sessions on sessions.id = claimed.session_id order by upload_order`, [labId, [...fileIds], staleAfterSeconds]);
  return rows.map((row) => ({
    id: row.id, name: row.name, sha256: row.sha256, byteCount: Number(row.byte_count), attempt: row.attempt, fields: row.fields, answers: row.answers, impedanceOhm: row.impedance_ohm,
  }));
}

/** Files of a job that are not done yet although this worker could not claim them: somebody else may still be reading them. */
export async function countUnfinished(db: Database, fileIds: readonly string[]): Promise<number> {
  const rows: unknown[] = await db('files').whereIn('id', [...fileIds]).whereIn('state', ['waiting', 'reading']).select('id');
  return rows.length;
}

/** A sign of life for all files that are being read. */
export async function beatHeart(db: Database, files: readonly Pick<ClaimedFile, 'id' | 'attempt'>[]): Promise<void> {
  await db('files').whereIn('id', files.map((file) => file.id)).where({ state: 'reading' }).update({ heartbeat_at: db.fn.now() });
}

/** Gives files back unread, because the worker is asked to stop. */
export async function releaseFiles(trx: Database, scope: { labId: string; sessionId: string }, files: readonly Pick<ClaimedFile, 'id' | 'attempt'>[]): Promise<void> {
  for (const file of files) {
    const released = await trx('files').where({ id: file.id, state: 'reading', attempt: file.attempt }).update({ state: 'waiting', heartbeat_at: trx.fn.now() });
    if (released === 1) await trx('outbox').insert({ lab_id: scope.labId, kind: 'read-files', session_id: scope.sessionId, file_id: file.id });
  }
}

export interface FileVerdict {
  readonly state: 'read' | 'needs answer' | 'refused';
  readonly transcription?: FileBody['transcription'] | undefined;
  readonly doubts: FileBody['doubts'];
  readonly problem?: FileBody['problem'] | undefined;
  readonly questions?: FileBody['questions'] | undefined;
}

/** Says what became of a file; false where the attempt is no longer the file's own, and nothing was changed. */
export async function settleFile(trx: Database, { id, attempt }: Pick<ClaimedFile, 'id' | 'attempt'>, verdict: FileVerdict): Promise<boolean> {
  const json = (value: unknown): string | null => (value === undefined ? null : JSON.stringify(value));
  const settled = await trx('files').where({ id, state: 'reading', attempt }).update({
    state: verdict.state, transcription: json(verdict.transcription), doubts: JSON.stringify(verdict.doubts), problem: json(verdict.problem), questions: json(verdict.questions), heartbeat_at: trx.fn.now(),
  });
  if (settled === 1) await trx('traces').where({ file_id: id }).delete();
  return settled === 1;
}
