import { openDatabase } from '@leeside/database/open-database';
import { announceLostWork, forgetSentRows } from '@leeside/database/outbox-store';
import { openJobQueue, startJobWorker } from '@leeside/job-queue/job-queue';
import { openFailFastRedis } from '@leeside/job-queue/redis-connection';
import { makeEventPublisher } from '@leeside/job-queue/session-event-bus';
import { openFolderStore } from '@leeside/object-store/folder-store';
import { pino } from 'pino';
import { readConfiguration } from './configuration.js';
import { computeCurves } from './jobs/compute-curves.js';
import { readFiles } from './jobs/read-files.js';
import { openReaderPool } from './reading/reader-pool.js';
import { relayOnce } from './relay.js';
import { repeatUntilStopped } from './repeat-until-stopped.js';

const configuration = readConfiguration();
const log = pino({ level: configuration.logLevel, base: { service: 'worker' } });
const relayRestMs = 150;
const temporaryLifeMs = 24 * 3600 * 1000;
const longestStopMs = 25_000;

let isStopping = false;
const onRedisError = (fault: Error): void => log.warn({ reason: fault.message }, 'queue');
const db = openDatabase({ url: configuration.databaseUrl, poolSize: configuration.concurrency * 2 + 4 });
const store = await openFolderStore(configuration.objectStoreFolder);
const eventRedis = openFailFastRedis(configuration.redisUrl, onRedisError);
const readers = openReaderPool();
const tools = { db, store, readers, publish: makeEventPublisher(eventRedis), log, isStopping: () => isStopping, storeFolder: configuration.objectStoreFolder };

const queue = openJobQueue({ redisUrl: configuration.redisUrl, prefix: configuration.queuePrefix, onError: onRedisError });
const relay = repeatUntilStopped(() => relayOnce(db, queue), { restMs: relayRestMs, onError: (fault) => log.warn({ reason: String(fault) }, 'relay') });
const reconciler = repeatUntilStopped(async () => {
  const lost = await announceLostWork(db, configuration.lostAfterSeconds);
  if (lost > 0) log.warn({ lost }, 'announced lost work again');
  await forgetSentRows(db);
  await store.sweepTemporary(temporaryLifeMs);
  return 0;
}, { restMs: configuration.reconcileEverySeconds * 1000, onError: (fault) => log.warn({ reason: String(fault) }, 'reconciler') });
const worker = startJobWorker({
  redisUrl: configuration.redisUrl, prefix: configuration.queuePrefix, concurrency: configuration.concurrency, onError: onRedisError,
  handlers: { 'read-files': (job) => readFiles(tools, job), 'compute-curves': (job) => computeCurves(tools, job) },
});
log.info('worker started');

async function stop(): Promise<void> {
  if (isStopping) return;
  isStopping = true;
  log.info('stopping');
  await Promise.all([relay.stop(), reconciler.stop(), worker.close(longestStopMs)]);
  readers.close();
  await queue.close();
  eventRedis.disconnect();
  await db.destroy();
  process.exit(0);
}
process.on('SIGTERM', () => void stop());
process.on('SIGINT', () => void stop());
