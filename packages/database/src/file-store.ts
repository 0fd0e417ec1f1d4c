import type { FileBody, UploadFields } from '@leeside/contracts/files';
import type { FileState } from '@leeside/contracts/file-states';
import type { Database } from './open-database.js';

export interface NewFile {
  readonly name: string;
  readonly sha256: string;
  readonly byteCount: number;
  readonly fields: UploadFields;
}

export interface KeptFile {
  readonly id: string;
  readonly name: string;
  readonly sha256: string;
  readonly state: FileState;
  readonly duplicateOf?: string;
}

export interface SessionScope {
  readonly labId: string;
  readonly sessionId: string;
}

interface ShortRow {
  id: string;
  name: string;
  sha256: string;
  state: FileState;
}

async function insertNew(trx: Database, { labId, sessionId }: SessionScope, personId: string, files: readonly NewFile[]): Promise<Map<string, ShortRow>> {
  const bySha = new Map(files.toReversed().map((file) => [file.sha256, file]));
  const rows: ShortRow[] = await trx('files').insert([...bySha.values()].toReversed().map((file) => ({
    lab_id: labId, session_id: sessionId, name: file.name, sha256: file.sha256, byte_count: file.byteCount, fields: JSON.stringify(file.fields), uploaded_by: personId,
  }))).onConflict(['session_id', 'sha256']).ignore().returning(['id', 'name', 'sha256', 'state']);
  return new Map(rows.map((row) => [row.sha256, row]));
}

/**
 * Adds the files of one request, all or none, with the work they make necessary. The same bytes again in the session are answered with
 * the first file.
 */
export async function insertFiles(trx: Database, scope: SessionScope, personId: string, files: readonly NewFile[]): Promise<KeptFile[]> {
  const fresh = await insertNew(trx, scope, personId, files);
  if (fresh.size > 0) {
    await trx('outbox').insert([...fresh.values()].map((row) => ({ lab_id: scope.labId, kind: 'read-files', session_id: scope.sessionId, file_id: row.id })));
  }
  const all: ShortRow[] = await trx('files').where({ session_id: scope.sessionId }).whereIn('sha256', files.map((file) => file.sha256)).select('id', 'name', 'sha256', 'state');
  const bySha = new Map(all.map((row) => [row.sha256, row]));
  const answered = new Set<string>();
  return files.flatMap((file) => {
    const row = bySha.get(file.sha256);
    if (!row) return [];
    const isFirst = fresh.has(file.sha256) && !answered.has(file.sha256);
    answered.add(file.sha256);
    return [{ ...row, ...(isFirst ? {} : { duplicateOf: row.id }) }];
  });
}

interface FileRow extends ShortRow {
  session_id: string;
  byte_count: number;
  uploaded_at: string;
  set_aside_at: string | null;
  transcription: FileBody['transcription'] | null;
  doubts: FileBody['doubts'];
  problem: FileBody['problem'] | null;
  questions: FileBody['questions'] | null;
  trace_ids: string[];
}

/** A file with how it was read. */
export async function findFile(db: Database, labId: string, id: string): Promise<FileBody | null> {
  const row: FileRow | undefined = await db('files').where({ id, lab_id: labId })
    .select('files.*', db.raw('array(select id from traces where file_id = files.id order by place_in_file) as trace_ids')).first();
  if (!row) return null;
  return {
    id: row.id, sessionId: row.session_id, name: row.name, sha256: row.sha256, bytes: row.byte_count, state: row.state, uploadedAt: row.uploaded_at,
    setAsideAt: row.set_aside_at, doubts: row.doubts, traces: row.trace_ids,
    ...(row.transcription === null ? {} : { transcription: row.transcription }),
    ...(row.problem === null ? {} : { problem: row.problem }),
    ...(row.questions === null ? {} : { questions: row.questions }),
  };
}

/** Sets a file aside or brings it back; the session it belongs to, or null where nothing changed. */
export async function setFileAside(trx: Database, labId: string, id: string, aside: boolean): Promise<string | null> {
  const query = trx('files').where({ id, lab_id: labId });
  const [row]: { session_id: string }[] = await (aside ? query.whereNull('set_aside_at') : query.whereNotNull('set_aside_at'))
    .update({ set_aside_at: aside ? trx.fn.now() : null }).returning('session_id');
  return row?.session_id ?? null;
}

/** States from which a file can be read once more; one that is read already is read again from the start. */
const canBeReadAgain: readonly FileState[] = ['refused', 'needs answer', 'read'];

/**
 * Makes a file wait for its reader again, with answers where given. What was read from it before goes with the new reading.
 * @returns its session, or null where the file is under way or unknown.
 */
export async function readFileAgain(trx: Database, labId: string, id: string, answers?: readonly { questionId: string; choiceId: string }[]): Promise<string | null> {
  const [row]: { session_id: string }[] = await trx('files').where({ id, lab_id: labId }).whereIn('state', [...canBeReadAgain])
    .update({ state: 'waiting', problem: null, questions: null, heartbeat_at: trx.fn.now(), ...(answers === undefined ? {} : { answers: JSON.stringify(answers) }) }).returning('session_id');
  if (!row) return null;
  await trx('outbox').insert({ lab_id: labId, kind: 'read-files', session_id: row.session_id, file_id: id });
  return row.session_id;
}

/** Answers a file was given so far. */
export async function readAnswers(db: Database, labId: string, id: string): Promise<{ questionId: string; choiceId: string }[]> {
  const row: { answers: { questionId: string; choiceId: string }[] } | undefined = await db('files').where({ id, lab_id: labId }).first('answers');
  return row?.answers ?? [];
}
