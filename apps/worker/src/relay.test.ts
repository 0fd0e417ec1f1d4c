import { expect, test } from 'vitest';
import { jobsOfRows } from './relay.js';

const labId = '11111111-1111-4111-8111-111111111111';
const sessionId = '22222222-2222-4222-8222-222222222222';
const fileId = (at: number): string => `33333333-3333-4333-8333-${String(at).padStart(12, '0')}`;
const reading = (at: number) => ({ id: at, labId, sessionId, kind: 'read-files' as const, fileId: fileId(at) });

test('files of a session travel together, fifty a job, and computing is asked for once', () => {
  const rows = [...Array.from({ length: 120 }, (_, at) => reading(at)), ...[200, 201].map((id) => ({ id, labId, sessionId, kind: 'compute-curves' as const, fileId: null }))];
  const jobs = jobsOfRows(rows);
  expect(jobs.map((job) => [job.kind, job.jobId])).toEqual([['read-files', 'read-0'], ['read-files', 'read-50'], ['read-files', 'read-100'], ['compute-curves', 'curves-201']]);
  const carried = jobs.flatMap((job) => ('fileIds' in job.payload ? job.payload.fileIds : []));
  expect(new Set(carried).size).toBe(120);
});
