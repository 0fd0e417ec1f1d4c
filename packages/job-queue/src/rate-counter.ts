import type { RedisConnection } from './redis-connection.js';

/** Counts what happened under a key within a window, over all processes; while Redis is away each process counts for itself. */
export interface RateCounter {
  /** Adds one and answers the count in the running window. */
  add(key: string): Promise<number>;
  /** The count without adding. */
  read(key: string): Promise<number>;
  clear(key: string): Promise<void>;
}

interface OwnCount {
  count: number;
  endsAtMs: number;
}

function makeOwnCounter(windowMs: number, nowMs: () => number) {
  const counts = new Map<string, OwnCount>();
  const current = (key: string): OwnCount => {
    const kept = counts.get(key);
    if (kept && kept.endsAtMs > nowMs()) return kept;
    return { count: 0, endsAtMs: nowMs() + windowMs };
  };
  return {
    add: (key: string): number => {
      const counter = current(key);
      counter.count += 1;
      counts.set(key, counter);
      return counter.count;
    },
    read: (key: string): number => current(key).count,
    clear: (key: string): void => void counts.delete(key),
  };
}

/**
 * Makes a counter.
 * @param redis where counts are shared.
 * @param options name of the counter, length of its window, and a clock for tests.
 */
export function makeRateCounter(redis: Pick<RedisConnection, 'incr' | 'pexpire' | 'get' | 'del'>, { name, windowMs, nowMs = Date.now }: { name: string; windowMs: number; nowMs?: () => number }): RateCounter {
  const own = makeOwnCounter(windowMs, nowMs);
  const keyOf = (key: string): string => `rate:${name}:${key}`;
  return {
    add: async (key) => {
      const alone = own.add(key);
      try {
        const count = await redis.incr(keyOf(key));
        if (count === 1) await redis.pexpire(keyOf(key), windowMs);
        return count;
      } catch {
        return alone;
      }
    },
    read: async (key) => {
      try {
        return Number((await redis.get(keyOf(key))) ?? 0);
      } catch {
        return own.read(key);
      }
    },
    clear: async (key) => {
      own.clear(key);
      await redis.del(keyOf(key)).catch(() => 0);
    },
  };
}
