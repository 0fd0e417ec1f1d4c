import { Redis } from 'ioredis';
import RedisMock from 'ioredis-mock';
import { afterAll, describe, expect, test } from 'vitest';
import { makeRateCounter } from './rate-counter.js';
import type { RedisConnection } from './redis-connection.js';
import { makeEventPublisher, makeEventSubscriber } from './session-event-bus.js';

const redisUrl = process.env['REDIS_URL'];
const kinds: [string, () => RedisConnection][] = [['the stand-in', () => new RedisMock()]];
if (redisUrl !== undefined) kinds.push(['a real Redis', () => new Redis(redisUrl)]);

describe.each(kinds)('on %s', (_name, open) => {
  const opened: RedisConnection[] = [];
  const connect = (): RedisConnection => {
    const redis = open();
    opened.push(redis);
    return redis;
  };
  afterAll(() => opened.forEach((redis) => redis.disconnect()));
  const unique = (): string => `test-${Math.random()}`;

  test('a rate counter counts, keeps keys apart, forgets after its window, and can be cleared', async () => {
    const counter = makeRateCounter(connect(), { name: unique(), windowMs: 150 });
    expect(await counter.add('a')).toBe(1);
    expect(await counter.add('a')).toBe(2);
    expect(await counter.add('b')).toBe(1);
    expect(await counter.read('a')).toBe(2);
    await counter.clear('b');
    expect(await counter.read('b')).toBe(0);
    await new Promise((resolve) => setTimeout(resolve, 300));
    expect(await counter.read('a')).toBe(0);
  });

  test('an event reaches every watcher of its session and no other', async () => {
    const publish = makeEventPublisher(connect());
    const subscriber = makeEventSubscriber(connect());
    const [session, other] = ['22222222-2222-4222-8222-222222222222', '33333333-3333-4333-8333-333333333333'];
    const seen: string[] = [];
    const stops = [await subscriber.watch(session, (event) => seen.push(`one ${event.kind}`)), await subscriber.watch(session, (event) => seen.push(`two ${event.kind}`))];
    const stopOther = await subscriber.watch(other, () => seen.push('other'));
    await publish(session, { kind: 'curve', id: session, state: 'ready' });
    await expect.poll(() => seen).toEqual(['one curve', 'two curve']);
    [...stops, stopOther].forEach((stop) => stop());
  });
});

test('without Redis a rate counter counts for itself', async () => {
  const away = () => Promise.reject(new Error('away'));
  let nowMs = 0;
  const counter = makeRateCounter({ incr: away, pexpire: away, get: away, del: away }, { name: 'sign-in', windowMs: 1000, nowMs: () => nowMs });
  expect(await counter.add('a')).toBe(1);
  expect(await counter.add('a')).toBe(2);
  nowMs = 1001;
  expect(await counter.read('a')).toBe(0);
});
