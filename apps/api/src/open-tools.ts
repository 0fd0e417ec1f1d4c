import { openDatabase } from '@leeside/database/open-database';
import { makeRateCounter } from '@leeside/job-queue/rate-counter';
import { openFailFastRedis, openPatientRedis } from '@leeside/job-queue/redis-connection';
import { makeEventSubscriber } from '@leeside/job-queue/session-event-bus';
import { openFolderStore } from '@leeside/object-store/folder-store';
import { pino } from 'pino';
import type { ApiTools } from './api-tools.js';
import { signInLimits } from './authentication/sign-in-limits.js';
import type { Configuration } from './configuration.js';

const poolSize = 10;

/** Opens everything that the API stands on, and says how to close it. */
export async function openTools(configuration: Configuration): Promise<{ tools: ApiTools; close: () => Promise<void> }> {
  const log = pino({ level: configuration.logLevel, base: { service: 'api' }, redact: { paths: ['password', '*.password', 'token', '*.token', 'authorization', '*.authorization', 'cookie', '*.cookie'], censor: '[removed]' } });
  const onRedisError = (fault: Error): void => log.warn({ reason: fault.message }, 'redis');
  const db = openDatabase({ url: configuration.databaseUrl, poolSize });
  const redis = openFailFastRedis(configuration.redisUrl, onRedisError);
  const listener = openPatientRedis(configuration.redisUrl, onRedisError);
  const { windowMs } = signInLimits;
  const tools: ApiTools = {
    db, store: await openFolderStore(configuration.objectStoreFolder), events: makeEventSubscriber(listener), log, pingRedis: () => redis.ping(), tokenSecret: configuration.tokenSecret,
    baseUrl: configuration.baseUrl, webFolder: configuration.webFolder,
    limits: { signInByAccount: makeRateCounter(redis, { name: 'sign-in-account', windowMs }), signInByAddress: makeRateCounter(redis, { name: 'sign-in-address', windowMs }) },
  };
  return {
    tools,
    close: async () => {
      redis.disconnect();
      listener.disconnect();
      await db.destroy();
    },
  };
}
