import { Redis } from 'ioredis';

/** The part of Redis that the small things use; what stands in for it in tests has it too. */
export type RedisConnection = Redis;

const slowestRetryMs = 2000;

/**
 * Opens a connection that fails at once while Redis is away, so that nobody waits for it.
 * @param url address with password.
 * @param onError told of every lost connection.
 */
export function openFailFastRedis(url: string, onError: (fault: Error) => void): RedisConnection {
  const redis = new Redis(url, { maxRetriesPerRequest: 1, enableOfflineQueue: false, connectTimeout: 2000, retryStrategy: (times) => Math.min(times * 200, slowestRetryMs) });
  redis.on('error', onError);
  return redis;
}

/** Opens a connection that waits for Redis to come back: for workers and subscribers. */
export function openPatientRedis(url: string, onError: (fault: Error) => void): RedisConnection {
  const redis = new Redis(url, { maxRetriesPerRequest: null, retryStrategy: (times) => Math.min(times * 200, slowestRetryMs) });
  redis.on('error', onError);
  return redis;
}
