import type { Today } from '@leeside/contracts/today';
import type { Database } from './open-database.js';

const most = 20;

const filesIn = (db: Database, labId: string, state: string, reason: string) => db('files').join('sessions', 'sessions.id', 'files.session_id')
  .where({ 'files.lab_id': labId, state }).whereNull('set_aside_at').orderBy('upload_order', 'desc').limit(most)
  .select('files.id as fileId', 'files.name', 'sessions.id as sessionId', 'sessions.title as sessionTitle', db.raw(reason));

/** What waits for a person of the lab. */
export async function readToday(db: Database, labId: string): Promise<Today> {
  const [filesNeedingAnswer, filesRefused, samplesOnTheBench, guessedTraces, curvesInDoubt, recentSessions] = await Promise.all([
    filesIn(db, labId, 'needs answer', `coalesce(files.questions->0->>'message', '') as reason`),
    filesIn(db, labId, 'refused', `coalesce(files.problem->>'message', '') as reason`),
    db('samples').where({ lab_id: labId, state: 'on the bench' }).orderBy('code').limit(most).select('id', 'code', 'name'),
    db('traces').join('files', 'files.id', 'traces.file_id').join('sessions', 'sessions.id', 'traces.session_id').where('traces.lab_id', labId).whereNull('files.set_aside_at').whereNull('set_aside')
      .whereRaw('(role_guessed or sample_guessed or role is null)').groupBy('sessions.id', 'sessions.title', 'sessions.held_on').orderBy('sessions.held_on', 'desc').limit(most)
      .select('sessions.id as sessionId', 'sessions.title as sessionTitle', db.raw('count(*)::int as count')),
    db('curves').join('sessions', 'sessions.id', 'curves.session_id').leftJoin('samples', 'samples.id', 'curves.sample_id').where('curves.lab_id', labId)
      .whereRaw(`doubts @> '[{"weight": "stops signing"}]'`).orderBy('computed_at', 'desc').limit(most)
      .select('curves.id as curveId', 'sessions.title as sessionTitle', 'samples.code as sampleCode', db.raw(`(select doubt->>'message' from jsonb_array_elements(doubts) as doubt where doubt->>'weight' = 'stops signing' limit 1) as doubt`)),
    db('sessions').where({ lab_id: labId }).orderBy([{ column: 'held_on', order: 'desc' }, { column: 'created_at', order: 'desc' }]).limit(5).select('id', 'title', 'held_on as heldOn'),
  ]);
  return { filesNeedingAnswer, filesRefused, samplesOnTheBench, guessedTraces, curvesInDoubt, recentSessions };
}
