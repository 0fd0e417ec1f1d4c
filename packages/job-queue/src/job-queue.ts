import { computeCurvesJobSchema, jobKinds, readFilesJobSchema, type ComputeCurvesJob, type JobKind, type ReadFilesJob } from '@leeside/contracts/jobs';
import { Queue, Worker } from 'bullmq';
import { openFailFastRedis, openPatientRedis } from './redis-connection.js';

export interface JobPayloads {
  'read-files': ReadFilesJob;
  'compute-curves': ComputeCurvesJob;
}
export interface JobToAdd<Kind extends JobKind = JobKind> {
  readonly kind: Kind;
  readonly payload: JobPayloads[Kind];
  /** The same id while the job still exists is added once; which work is done is decided by the database alone. */
  readonly jobId: string;
}
export type JobHandlers = { readonly [Kind in JobKind]: (payload: JobPayloads[Kind]) => Promise<void> };

/** Adds jobs; fails at once while Redis is away. */
export interface JobQueue {
  add(jobs: readonly JobToAdd[]): Promise<void>;
  close(): Promise<void>;
}

const daySeconds = 86_400;
const options = {
  attempts: 5, backoff: { type: 'exponential', delay: 1000 },
  removeOnComplete: { age: daySeconds, count: 1000 }, removeOnFail: { age: 7 * daySeconds, count: 5000 },
};
const payloadSchemas = { 'read-files': readFilesJobSchema, 'compute-curves': computeCurvesJobSchema };

/** Where the queue is; copies that share a Redis keep apart by the prefix of their keys. */
export interface QueuePlace {
  readonly redisUrl: string;
  readonly prefix: string;
  readonly onError: (fault: Error) => void;
}

/** Opens the queue for adding. */
export function openJobQueue({ redisUrl, prefix, onError }: QueuePlace): JobQueue {
  const connection = openFailFastRedis(redisUrl, onError);
  const queues = new Map(jobKinds.map((kind) => {
    const queue = new Queue(kind, { connection, prefix, skipWaitingForReady: true, skipVersionCheck: true, streams: { events: { maxLen: 1000 } } });
    queue.on('error', onError);
    return [kind, queue];
  }));
  return {
    add: async (jobs) => {
      for (const kind of jobKinds) {
        const ofKind = jobs.filter((job) => job.kind === kind);
        if (ofKind.length === 0) continue;
        await queues.get(kind)?.addBulk(ofKind.map(({ payload, jobId }) => ({ name: kind, data: payloadSchemas[kind].parse(payload), opts: { ...options, jobId } })));
      }
    },
    close: async () => {
      await Promise.all([...queues.values()].map((queue) => queue.close().catch(onError)));
      connection.disconnect();
    },
  };
}

export interface JobWorker {
  /** Stops taking jobs and waits for those under way, at most so long. */
  close(longestMs: number): Promise<void>;
}

/** Takes jobs of every kind. A lock lasts 10 s and a dead worker's job is taken up again within 15. */
export function startJobWorker({ redisUrl, prefix, onError, handlers, concurrency }: QueuePlace & { handlers: JobHandlers; concurrency: number }): JobWorker {
  const connection = openPatientRedis(redisUrl, onError);
  const workers = jobKinds.map((kind) => {
    const handle = handlers[kind] as (payload: unknown) => Promise<void>;
    const worker = new Worker(kind, (job) => handle(payloadSchemas[kind].parse(job.data)), {
      connection, prefix, concurrency, lockDuration: 10_000, stalledInterval: 5000, maxStalledCount: 2, drainDelay: 1,
    });
    worker.on('error', onError);
    worker.on('failed', (_job, fault) => onError(fault));
    return worker;
  });
  return {
    close: async (longestMs) => {
      const gone = Promise.all(workers.map((worker) => worker.close().catch(onError)));
      await Promise.race([gone, new Promise((resolve) => setTimeout(resolve, longestMs).unref())]);
      connection.disconnect();
    },
  };
}
