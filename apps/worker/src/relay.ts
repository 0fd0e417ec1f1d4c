import { filesPerJob } from '@leeside/contracts/jobs';
import type { Database } from '@leeside/database/open-database';
import { relayOutbox, type OutboxRow } from '@leeside/database/outbox-store';
import type { JobQueue, JobToAdd } from '@leeside/job-queue/job-queue';

const rowsPerRound = 500;

/** Outbox rows as jobs: files of a session together, up to 50 a job; one computing job a session. */
export function jobsOfRows(rows: readonly OutboxRow[]): JobToAdd[] {
  const sessions = new Map<string, OutboxRow[]>();
  for (const row of rows) sessions.set(row.sessionId, [...(sessions.get(row.sessionId) ?? []), row]);
  return [...sessions.values()].flatMap((ofSession) => [...readingJobs(ofSession.filter((row) => row.kind === 'read-files')), ...computingJobs(ofSession.filter((row) => row.kind === 'compute-curves'))]);
}

function readingJobs(rows: readonly OutboxRow[]): JobToAdd[] {
  const jobs: JobToAdd[] = [];
  for (let at = 0; at < rows.length; at += filesPerJob) {
    const [first, ...rest] = rows.slice(at, at + filesPerJob);
    if (!first) continue;
    const fileIds = [...new Set([first, ...rest].flatMap((row) => row.fileId ?? []))];
    jobs.push({ kind: 'read-files', jobId: `read-${first.id}`, payload: { labId: first.labId, sessionId: first.sessionId, fileIds } });
  }
  return jobs;
}

function computingJobs(rows: readonly OutboxRow[]): JobToAdd[] {
  const last = rows.at(-1);
  return last ? [{ kind: 'compute-curves', jobId: `curves-${last.id}`, payload: { labId: last.labId, sessionId: last.sessionId } }] : [];
}

/** Carries one round of outbox rows to the queue; answers how many. */
export function relayOnce(db: Database, queue: JobQueue): Promise<number> {
  return relayOutbox(db, rowsPerRound, (rows) => queue.add(jobsOfRows(rows)));
}
