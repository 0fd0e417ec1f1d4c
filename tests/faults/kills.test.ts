import { createHash } from 'node:crypto';
import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import { setTimeout as rest } from 'node:timers/promises';
import { openDatabase } from '@leeside/database/open-database';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { apiClient, uploadForm, type SessionBody, type UploadPart } from '../journeys/api-client.js';
import { startSystem, type RunningSystem } from '../journeys/running-system.js';
import { seededRandom } from './seeded-random.js';

const fileCount = 50;
const kills = Number(process.env['FAULT_KILLS'] ?? 20);
const seed = 20_261_201;

/** Fifty small sweeps: two references, a noise sweep, the rest enclosed, each unlike the others. */
function sweepFiles(): UploadPart[] {
  const text = (levelDbm: number): string => `Frequency [MHz],Level [dBm]\n${Array.from({ length: 201 }, (_, at) => `${100 + at},${(levelDbm + Math.sin(at)).toFixed(3)}`).join('\n')}\n`;
  const file = (fileName: string, levelDbm: number): UploadPart => ({ fileName, bytes: new TextEncoder().encode(text(levelDbm)) });
  const role = (value: string): UploadPart => ({ field: 'role', value });
  return [
    role('reference'), file('ref-1.csv', -20), file('ref-2.csv', -20.2), role('noise'), file('noise.csv', -110),
    role('enclosed'), ...Array.from({ length: fileCount - 3 }, (_, at) => file(`enclosed-${at}.csv`, -60 - at / 10)),
  ];
}

/** Sends until it is acknowledged, as a bench laptop would whose server comes and goes. */
async function sendUntilTaken(system: RunningSystem, token: string, sessionId: string, key: string): Promise<{ items: { id: string; sha256: string }[] }> {
  for (;;) {
    const response = await fetch(`${system.baseUrl}/api/v1/sessions/${sessionId}/files`, { method: 'POST', headers: { Authorization: `Bearer ${token}`, 'Idempotency-Key': key }, body: uploadForm(sweepFiles()) }).catch(() => null);
    if (response?.status === 202) return (await response.json()) as { items: { id: string; sha256: string }[] };
    await rest(150);
  }
}

async function keysInStore(folder: string): Promise<string[]> {
  return (await readdir(join(folder, 'kept'), { recursive: true, withFileTypes: true })).filter((entry) => entry.isFile()).map((entry) => entry.name).sort();
}

describe(`seed ${seed}: ${kills} kills of each program during uploads of ${fileCount} files`, () => {
  let system: RunningSystem;
  beforeAll(async () => {
    system = await startSystem({ environment: { RECONCILE_SECONDS: '1', LOST_AFTER_SECONDS: '4' } });
  });
  afterAll(() => system.stop());

  async function survive(kill: (random: () => number) => Promise<void>, random: () => number, round: number): Promise<void> {
    const token = await system.tokenOf('engineer');
    const client = apiClient(system.baseUrl, token);
    const { id } = await client.post<{ id: string }>('/sessions', { title: `Round ${round}`, heldOn: '2026-11-30' });
    const [sent] = await Promise.all([sendUntilTaken(system, token, id, `round-${round}`), kill(random)]);
    const session = await client.settled(id, 90_000);
    expect(session.files).toHaveLength(fileCount);
    expect(session.progress).toMatchObject({ read: fileCount, refused: 0, needsAnswer: 0, curvesReady: fileCount - 3 });
    expect(new Set(sent.items.map((item) => item.id)).size).toBe(fileCount);
    await nothingTwice(id, session);
  }

  async function nothingTwice(sessionId: string, session: SessionBody): Promise<void> {
    const db = openDatabase({ url: system.databaseUrl, poolSize: 1 });
    const traces: { file_id: string }[] = await db('traces').where({ session_id: sessionId }).select('file_id');
    const rows: { sha256: string }[] = await db('files').select('sha256').distinct();
    const points: unknown[] = await db('curve_points').join('curves', 'curves.id', 'curve_points.curve_id').where('curves.session_id', sessionId);
    await db.destroy();
    expect(traces.map((trace) => trace.file_id).sort()).toEqual(session.files.map((file) => file.id).sort());
    expect(points).toHaveLength(fileCount - 3);
    const stored = await keysInStore(system.objectStoreFolder);
    for (const { sha256 } of rows) expect(stored).toContain(sha256);
    const wanted = sweepFiles().flatMap((part) => ('bytes' in part ? [createHash('sha256').update(part.bytes).digest('hex')] : []));
    expect(rows.map((row) => row.sha256).sort()).toEqual([...new Set(wanted)].sort());
    expect(stored).toEqual([...new Set(wanted)].sort());
  }

  test('a worker that is killed loses nothing and does nothing twice', async () => {
    const random = seededRandom(seed);
    for (let round = 0; round < kills; round += 1) {
      await survive(async () => {
        await rest(random() * 900);
        system.workers().at(-1)?.kill('SIGKILL');
        await system.startWorker();
      }, random, round);
    }
  }, 30 * 60_000);

  test('an API that is killed loses nothing that it acknowledged and keeps nothing twice', async () => {
    const random = seededRandom(seed + 1);
    for (let round = 0; round < kills; round += 1) {
      await survive(async () => {
        await rest(random() * 250);
        system.api().kill('SIGKILL');
        await system.startApi();
      }, random, 1000 + round);
    }
  }, 30 * 60_000);
});
