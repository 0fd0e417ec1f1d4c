import { createHash } from 'node:crypto';
import { appendFileSync, writeFileSync } from 'node:fs';
import { mkdtemp, readFile, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { exitCode } from './exit-code.js';
import { sendFolder } from './send-command.js';
import { startFakeServer, type FakeServer, type Mishap } from './test-server/fake-server.js';

// A call that hangs is cut only after half a minute: slow is no failure here.
vi.setConfig({ testTimeout: 300_000 });

const sessionId = '11111111-1111-4111-8111-111111111111';
const quickPace = { restMs: 5, quietMs: 150, firstPauseMs: 5, longestPauseMs: 40, answerWithinMs: 1000, slowestBytesPerSecond: 50_000 };
const fileCount = 100;
const restartCount = 10;
const mishaps: readonly Mishap[] = ['not ready', 'cut before storing', 'reply lost', 'reply cut'];

/** Numbers from 0 to 1 that are the same for the same seed (a linear congruential generator, constants of Numerical Recipes). */
function seededNumbers(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

let server: FakeServer;
let folder: string;
beforeEach(async () => {
  server = await startFakeServer();
  folder = await mkdtemp(join(tmpdir(), 'leeside-restarts-'));
});
afterEach(async () => {
  await server.goAway();
  await rm(folder, { recursive: true });
});

/** An instrument that writes its sweeps in two halves, now and then pausing between them. */
async function writeSweeps(random: () => number, afterEachFile: (at: number) => void): Promise<void> {
  for (let at = 0; at < fileCount; at += 1) {
    const path = join(folder, `sweep-${String(at).padStart(3, '0')}.csv`);
    writeFileSync(path, `frequency;level\n${at};`);
    await sleep(random() * 6);
    appendFileSync(path, `${-20 - at}\n`);
    afterEachFile(at);
    if (random() < 0.2) await sleep(random() * 40);
  }
}

async function restart(random: () => number): Promise<void> {
  await server.goAway();
  await sleep(random() * 80);
  await server.comeBack();
}

const shaOf = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex');
async function shasOfFolder(): Promise<string[]> {
  const names = await readdir(folder);
  return Promise.all(names.sort().map(async (name) => shaOf(await readFile(join(folder, name)))));
}

describe('watching a folder while the server restarts at any moment', () => {
  it.each([1, 2, 3])(`stores each of ${fileCount} files once through ${restartCount} restarts (seed %i)`, async (seed) => {
    const random = seededNumbers(seed);
    server.mishapOf = ({ method }) => (random() < (method === 'POST' ? 0.4 : 0.05) ? (mishaps[Math.floor(random() * mishaps.length)] ?? null) : null);
    const stopping = new AbortController();
    const watching = sendFolder({ url: server.url, token: 'right', pace: quickPace }, { folder, sessionId, watch: true, say: () => undefined, stopping: stopping.signal });
    const moments = new Set<number>();
    while (moments.size < restartCount) moments.add(Math.floor(random() * fileCount));
    let restarts = Promise.resolve();
    let restarted = 0;
    await writeSweeps(random, (at) => {
      if (moments.has(at)) restarts = restarts.then(() => restart(random)).then(() => void (restarted += 1));
    });
    await restarts;
    while (server.stored.length < fileCount) await sleep(10);
    stopping.abort();
    const { files, code } = await watching;

    expect(restarted).toBe(restartCount);
    expect(Object.values(server.counts.mishaps).reduce((sum, count) => sum + count)).toBeGreaterThan(0);
    expect(server.stored.map(({ sha256 }) => sha256).sort()).toEqual((await shasOfFolder()).sort());
    expect(server.stored.map(({ name }) => name).sort()).toEqual((await readdir(folder)).sort());
    expect(server.counts.duplicates).toBe(0);
    expect(new Set(files.map(({ id }) => id)).size).toBe(fileCount);
    expect(files.every(({ state }) => state === 'read')).toBe(true);
    expect(code).toBe(exitCode.done);
  });

  it('stores nothing twice when the command itself is begun anew', async () => {
    const random = seededNumbers(5);
    await writeSweeps(random, () => undefined);
    const stopping = new AbortController();
    const leaving = new AbortController();
    const options = { folder, sessionId, watch: false, say: () => undefined, stopping: stopping.signal };
    server.mishapOf = (request) => {
      if (request.method !== 'POST' || server.stored.length === 0) return null;
      leaving.abort();
      return 'reply lost';
    };
    const first = await sendFolder({ url: server.url, token: 'right', pace: quickPace, leaving: leaving.signal }, options);
    expect(first.code).toBe(exitCode.interrupted);
    expect(first.files.filter(({ state }) => state === 'not confirmed')).toHaveLength(50);
    server.mishapOf = () => null;
    const second = await sendFolder({ url: server.url, token: 'right', pace: quickPace }, options);
    expect(second.files.filter(({ state }) => state === 'read')).toHaveLength(fileCount);
    expect(server.stored).toHaveLength(fileCount);
    expect(server.counts.answeredFromKey).toBeGreaterThanOrEqual(1);
  });
});
