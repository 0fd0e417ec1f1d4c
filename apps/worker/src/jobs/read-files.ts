import type { ReadFilesJob } from '@leeside/contracts/jobs';
import { beatHeart, claimFiles, countUnfinished, releaseFiles, settleFile, type ClaimedFile } from '@leeside/database/file-reading-store';
import { announcePendingCurves, markCurvesPending } from '@leeside/database/mark-curves-pending';
import { inTransaction } from '@leeside/database/open-database';
import { listSampleCodes } from '@leeside/database/sample-store';
import { readProgress } from '@leeside/database/session-store';
import { insertSweeps } from '@leeside/database/sweep-store';
import { insertTraces, type NewTrace } from '@leeside/database/trace-store';
import { rawFileKey } from '@leeside/object-store/object-store';
import type { WorkerTools } from '../worker-tools.js';
import { traceRows } from './trace-rows.js';
import { outcomeOfAnswer, outcomeOfCrash, type FileOutcome } from './verdict-of-reading.js';

const heartbeatMs = 4000;
const filesPerCommit = 10;

interface ReadFile {
  readonly file: ClaimedFile;
  readonly outcome: FileOutcome;
}

/** Reads the files of a job, each in the reader process, and keeps what was read in transactions of a few files. */
export async function readFiles(tools: WorkerTools & { storeFolder: string }, job: ReadFilesJob): Promise<void> {
  const files = await claimFiles(tools.db, job.labId, job.fileIds);
  await announce(tools, job.sessionId, files.map((file) => ({ ...file, state: 'reading' as const })));
  const beat = setInterval(() => void beatHeart(tools.db, files).catch((fault: unknown) => tools.log.warn({ fault }, 'no heartbeat')), heartbeatMs);
  try {
    for (let at = 0; at < files.length; at += filesPerCommit) {
      if (tools.isStopping()) {
        await inTransaction(tools.db, (trx) => releaseFiles(trx, job, files.slice(at)));
        return;
      }
      const read: ReadFile[] = [];
      for (const file of files.slice(at, at + filesPerCommit)) read.push({ file, outcome: await readOne(tools, job.labId, file) });
      await keep(tools, job, read);
    }
  } finally {
    clearInterval(beat);
  }
  if (files.length < job.fileIds.length && (await countUnfinished(tools.db, job.fileIds)) > 0) throw new Error('Files of this job are held by another worker; trying again.');
}

async function readOne(tools: WorkerTools & { storeFolder: string }, labId: string, file: ClaimedFile): Promise<FileOutcome> {
  const request = {
    storeFolder: tools.storeFolder, key: rawFileKey(labId, file.sha256), sha256: file.sha256, byteCount: file.byteCount, fileName: file.name, impedanceOhm: file.impedanceOhm, answers: file.answers,
  };
  const attempt = async (): Promise<FileOutcome> => outcomeOfAnswer(await tools.readers.read(request));
  return attempt().catch((fault: unknown) => {
    tools.log.warn({ fault, fileId: file.id }, 'reading the file once more');
    return attempt().catch(outcomeOfCrash);
  });
}

/** Keeps traces, numbers and states of a few files, and marks the curves they concern, all in one transaction. */
async function keep(tools: WorkerTools, job: ReadFilesJob, read: readonly ReadFile[]): Promise<void> {
  const settled = await inTransaction(tools.db, async (trx) => {
    const samples = await listSampleCodes(trx, job.labId);
    const kept: ReadFile[] = [];
    const traces: NewTrace[] = [];
    const sweeps: { traceId: string; frequencyHz: Float64Array; level: Float32Array }[] = [];
    for (const one of read) {
      if (!(await settleFile(trx, one.file, one.outcome.verdict))) continue;
      kept.push(one);
      const rows = traceRows(one.file, one.outcome.sweeps, samples);
      traces.push(...rows);
      rows.forEach((row, at) => {
        const sweep = one.outcome.sweeps[at]?.sweep;
        if (sweep) sweeps.push({ traceId: row.id, frequencyHz: sweep.frequencyHz, level: sweep.level });
      });
    }
    await insertTraces(trx, job, traces);
    await insertSweeps(trx, job.labId, sweeps);
    if (traces.length > 0) await markCurvesPending(trx, job, affectedBy(traces));
    else await announcePendingCurves(trx, job);
    return kept;
  });
  await announce(tools, job.sessionId, settled.map(({ file, outcome }) => ({ ...file, state: outcome.verdict.state })));
}

/** A reference or noise sweep concerns every curve of its session; an enclosed one its own. */
function affectedBy(traces: readonly NewTrace[]): { sampleIds: string[]; traceIds: string[] } | null {
  if (traces.some((trace) => trace.role !== 'enclosed' && trace.role !== null)) return null;
  return { sampleIds: traces.flatMap((trace) => trace.sampleId ?? []), traceIds: traces.map((trace) => trace.id) };
}

async function announce(tools: WorkerTools, sessionId: string, files: readonly { id: string; name: string; state: 'reading' | FileOutcome['verdict']['state'] }[]): Promise<void> {
  for (const { id, name, state } of files) await tools.publish(sessionId, { kind: 'file', id, name, state });
  const progress = files.length > 0 ? await readProgress(tools.db, sessionId) : null;
  if (progress) await tools.publish(sessionId, { kind: 'progress', progress });
}
