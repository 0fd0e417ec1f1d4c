import { utimesSync, writeFileSync } from 'node:fs';
import { mkdir, mkdtemp, rename, rm, truncate, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { CommandFault, exitCode } from './exit-code.js';
import { sendFolder, type SendReport } from './send-command.js';
import { startFakeServer, type FakeServer } from './test-server/fake-server.js';

const sessionId = '11111111-1111-4111-8111-111111111111';
const quickPace = { restMs: 5, quietMs: 20, firstPauseMs: 5, longestPauseMs: 40, answerWithinMs: 2000, slowestBytesPerSecond: 50_000 };

let server: FakeServer;
let folder: string;
let stopping: AbortController;
let leaving: AbortController;
let said: string[];

beforeEach(async () => {
  server = await startFakeServer();
  folder = await mkdtemp(join(tmpdir(), 'leeside-send-'));
  stopping = new AbortController();
  leaving = new AbortController();
  said = [];
});
afterEach(async () => {
  await server.goAway();
  await rm(folder, { recursive: true });
});

const send = (options: { watch?: boolean; token?: string; quietMs?: number } = {}): Promise<SendReport> =>
  sendFolder({ url: server.url, token: options.token ?? 'right', pace: { ...quickPace, quietMs: options.quietMs ?? quickPace.quietMs }, leaving: leaving.signal }, {
    folder, sessionId, watch: options.watch ?? false, say: (words) => said.push(words), stopping: stopping.signal,
  });
const write = (name: string, text = `frequency;level\n1;${name}\n`): Promise<void> => writeFile(join(folder, name), text);
async function until(condition: () => boolean): Promise<void> {
  for (let waitedMs = 0; !condition(); waitedMs += 5) {
    if (waitedMs > 10_000) throw new Error(`Waited in vain. Said so far: ${said.slice(-5).join(' | ')}`);
    await sleep(5);
  }
}

describe('sending a folder once', () => {
  it('sends each file, waits until it is read and reports by its own name', async () => {
    await Promise.all(['a.csv', 'b.csv', '.hidden', 'c.csv.part'].map((name) => write(name)));
    await mkdir(join(folder, 'inner'));
    await write('copy-of-a.csv', 'frequency;level\n1;a.csv\n');
    const { files, code } = await send();
    expect(files.map(({ name, state }) => [name, state])).toEqual([['a.csv', 'read'], ['b.csv', 'read'], ['copy-of-a.csv', 'read']]);
    expect(files[2]?.id).toBe(files[0]?.id);
    expect(server.stored.map(({ name }) => name)).toEqual(['a.csv', 'b.csv']);
    expect(code).toBe(exitCode.done);
  });

  it('takes no more than 50 files into one request', async () => {
    await Promise.all(Array.from({ length: 101 }, (_, at) => write(`${at}.csv`)));
    const { files } = await send();
    expect(files).toHaveLength(101);
    expect(server.counts.uploads).toBe(3);
    expect(said.filter((words) => words.includes('sent'))).toEqual(['50 sent, 51 to go', '100 sent, 1 to go', '101 sent']);
  });

  it.each([
    ['refused', exitCode.refused, 'b.csv holds no sweep.'], ['needs answer', exitCode.needsAnswer, undefined],
  ] as const)('tells of a file that is %s', async (state, code, problem) => {
    await Promise.all([write('a.csv'), write('b.csv')]);
    server.stateOf = (name) => (name === 'b.csv' ? state : 'read');
    const report = await send();
    expect(report.code).toBe(code);
    expect(report.files[1]).toMatchObject({ name: 'b.csv', state, ...(problem === undefined ? {} : { problem }) });
  });

  it('leaves out a file that no request may hold, and sends the others', async () => {
    await Promise.all([write('a.csv'), write('huge.csv')]);
    await truncate(join(folder, 'huge.csv'), 64 * 1024 * 1024 + 1);
    const report = await send();
    expect(server.stored.map(({ name }) => name)).toEqual(['a.csv']);
    expect(report.code).toBe(exitCode.failed);
    expect(report.files.find(({ name }) => name === 'huge.csv')).toEqual({ name: 'huge.csv', id: null, state: 'not sent', problem: 'It is larger than 64 MiB.' });
  });

  it('gives up on what does not pass, in the words of the server', async () => {
    await write('bad-form.csv');
    await expect(send()).rejects.toThrow(new CommandFault('As told: The form is malformed.'));
    await expect(send({ token: 'wrong' })).rejects.toThrow('The token is not known.');
    expect(server.counts.uploads).toBe(1);
  });

  it('says which folder cannot be read', async () => {
    await expect(sendFolder({ url: server.url, token: 'right' }, { folder: join(folder, 'none'), sessionId, watch: false, say: () => undefined, stopping: stopping.signal }))
      .rejects.toThrow(/none cannot be read: ENOENT/);
  });
});

describe('sending to a server that fails', () => {
  it.each(['not ready', 'cut before storing', 'reply lost', 'reply cut'] as const)('tries the same request again after: %s', async (mishap) => {
    await Promise.all([write('a.csv'), write('b.csv')]);
    let requests = 0;
    server.mishapOf = () => (requests++ < 3 ? mishap : null);
    const report = await send();
    expect(report.code).toBe(exitCode.done);
    expect(server.counts.mishaps[mishap]).toBe(3);
    expect(server.stored).toHaveLength(2);
    expect(server.counts.duplicates).toBe(0);
    expect(server.counts.answeredFromKey).toBe(mishap.startsWith('reply') ? 3 : 0);
  });

  it('sends the bytes it read first although the file changes between two tries', async () => {
    await write('a.csv', 'first');
    server.mishapOf = () => (server.counts.mishaps['reply lost'] === 0 ? 'reply lost' : null);
    const sending = send();
    await until(() => server.stored.length === 1);
    await write('a.csv', 'second');
    await sending;
    expect(server.stored).toHaveLength(1);
    expect(server.counts.answeredFromKey).toBe(1);
  });
});

describe('sending to a server that never answers', () => {
  it('does not wait for ever, neither for a file to be taken nor for its reading', async () => {
    await write('a.csv');
    const waited = new Set<string>();
    server.mishapOf = ({ method = '' }) => (waited.size < waited.add(method).size ? 'no answer' : null);
    const line = { url: server.url, token: 'right', pace: { ...quickPace, answerWithinMs: 100 } };
    const report = await sendFolder(line, { folder, sessionId, watch: false, say: (words) => said.push(words), stopping: stopping.signal });
    expect(report.code).toBe(exitCode.done);
    expect(server.counts.mishaps['no answer']).toBe(2);
    expect(said.filter((words) => words.includes('no answer within 0.1'))).toHaveLength(2);
  });
});

describe('watching a folder', () => {
  it('sends what appears, and again what is written anew', async () => {
    const watching = send({ watch: true });
    await write('a.csv', 'one');
    await until(() => server.stored.length === 1);
    await write('a.csv', 'another');
    await write('b.csv');
    await until(() => server.stored.length === 3);
    stopping.abort();
    const { files, code } = await watching;
    expect(files.map(({ name, state }) => `${name} ${state}`).sort()).toEqual(['a.csv read', 'a.csv read', 'b.csv read']);
    expect(code).toBe(exitCode.done);
  });

  it('waits until a file is whole, whatever the time on it says', async () => {
    const path = join(folder, 'slow.csv');
    const watching = send({ watch: true, quietMs: 150 });
    for (let rows = 1; rows <= 20; rows += 1) {
      writeFileSync(path, 'row\n'.repeat(rows));
      utimesSync(path, rows, rows);
      await sleep(3);
    }
    const ahead = Date.now() / 1000 + 3600;
    utimesSync(path, ahead, ahead);
    await until(() => server.stored.length > 0);
    stopping.abort();
    await watching;
    expect(server.stored.map(({ bytes }) => bytes)).toEqual([80]);
  });

  it('tells at once of a file that is refused', async () => {
    server.stateOf = () => 'refused';
    const watching = send({ watch: true });
    await write('a.csv');
    await until(() => said.includes('refused: a.csv: a.csv holds no sweep.'));
    stopping.abort();
    expect((await watching).code).toBe(exitCode.refused);
    expect(said.filter((words) => words.startsWith('refused'))).toHaveLength(1);
  });

  it('lives through the folder being away', async () => {
    const away = `${folder}-away`;
    const watching = send({ watch: true });
    await rename(folder, away);
    await until(() => said.some((words) => words.includes('cannot be read')));
    await rename(away, folder);
    await write('a.csv');
    await until(() => server.stored.length === 1);
    stopping.abort();
    expect((await watching).files).toHaveLength(1);
    expect(said.filter((words) => words.includes('cannot be read'))).toHaveLength(1);
  });
});

describe('being interrupted', () => {
  it('finishes the batch under way and begins no other', async () => {
    await Promise.all(Array.from({ length: 70 }, (_, at) => write(`${String(at).padStart(2, '0')}.csv`)));
    server.mishapOf = (request) => {
      if (request.method === 'POST') stopping.abort();
      return server.counts.mishaps['reply lost'] < 2 ? 'reply lost' : null;
    };
    const { files, code } = await send({ watch: true });
    expect(server.stored).toHaveLength(50);
    expect(files.filter(({ state }) => state === 'read')).toHaveLength(50);
    expect(files.filter(({ problem }) => problem === 'Stopped before its turn.')).toHaveLength(20);
    expect(code).toBe(exitCode.failed);
  });

  it.each([true, false])('does not wait for a file that is never read after a second Ctrl-C (watching: %s)', async (watch) => {
    server.stateOf = () => 'never read';
    await write('a.csv');
    const sending = send({ watch });
    await until(() => server.stored.length === 1);
    stopping.abort();
    await sleep(30);
    const beganAtMs = performance.now();
    leaving.abort();
    const { files, code } = await sending;
    expect(performance.now() - beganAtMs).toBeLessThan(500);
    expect(code).toBe(exitCode.interrupted);
    expect(files).toMatchObject([{ name: 'a.csv', id: server.stored[0]?.id }]);
  });

  it('does not wait for a server that stays away, and claims nothing of what it did not confirm', async () => {
    await server.goAway();
    await write('a.csv');
    const sending = send();
    await until(() => said.some((words) => words.includes('Trying again')));
    stopping.abort();
    leaving.abort();
    const { files, code } = await sending;
    expect(code).toBe(exitCode.interrupted);
    expect(files).toMatchObject([{ name: 'a.csv', id: null, state: 'not confirmed' }]);
  });
});
