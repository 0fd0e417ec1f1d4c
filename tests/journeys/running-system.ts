import { fork, type ChildProcess } from 'node:child_process';
import { randomInt } from 'node:crypto';
import { once } from 'node:events';
import { existsSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { hashPassword } from '../../apps/api/src/authentication/passwords.js';
import { readDemoManifest } from '../../apps/api/src/demo/demo-manifest.js';
import { seedDemoLab } from '../../apps/api/src/demo/seed-demo-lab.js';
import { openDatabase } from '@leeside/database/open-database';
import { freshDatabase, serviceUrl } from './fresh-database.js';

export const demoPassword = 'a-password-of-the-demo';
const root = fileURLToPath(new URL('../../', import.meta.url));
const redisDatabases = 15;

/** The real API and worker on a database and a store of their own, with the demo lab's people and samples. */
export interface RunningSystem {
  readonly baseUrl: string;
  readonly databaseUrl: string;
  readonly objectStoreFolder: string;
  /** A bearer token of the demo account with this role; client-a and client-b too. */
  tokenOf(account: 'engineer' | 'analyst' | 'qa' | 'admin' | 'client-a' | 'client-b'): Promise<string>;
  /** The process as it is now; a test may kill it. */
  api(): ChildProcess;
  workers(): readonly ChildProcess[];
  startApi(): Promise<void>;
  startWorker(): Promise<void>;
  stop(): Promise<void>;
}

export interface SystemOptions {
  readonly workers?: number;
  /** Variables on top of the usual ones, such as shorter timers. */
  readonly environment?: Readonly<Record<string, string>>;
}

function startProgram(entry: string, environment: Record<string, string>): ChildProcess {
  return fork(join(root, entry), [], {
    execArgv: ['--conditions=source', '--import', 'tsx'], env: { PATH: process.env['PATH'] ?? '', ...environment }, stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
  });
}

async function listening(child: ChildProcess): Promise<number> {
  const gone = once(child, 'exit').then(([code]) => {
    throw new Error(`The API ended with ${String(code)} before it listened.`);
  });
  const [message] = (await Promise.race([once(child, 'message'), gone])) as [{ port: number }];
  return message.port;
}

async function end(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const gone = once(child, 'exit');
  child.kill('SIGTERM');
  const timer = setTimeout(() => child.kill('SIGKILL'), 8000);
  await gone;
  clearTimeout(timer);
}

async function seed(databaseUrl: string): Promise<void> {
  const db = openDatabase({ url: databaseUrl, poolSize: 1 });
  await seedDemoLab(db, await readDemoManifest(), await hashPassword(demoPassword)).finally(() => db.destroy());
}

async function makeToken(baseUrl: string, account: string): Promise<string> {
  const json = { 'Content-Type': 'application/json' };
  const signedIn = await fetch(`${baseUrl}/api/v1/auth/sign-in`, { method: 'POST', headers: json, body: JSON.stringify({ email: `${account}@leeside.example`, password: demoPassword }) });
  const { csrfToken } = (await signedIn.json()) as { csrfToken: string };
  const headers = { ...json, 'X-CSRF-Token': csrfToken, Cookie: signedIn.headers.getSetCookie().map((cookie) => cookie.split(';')[0]).join('; ') };
  const made = await fetch(`${baseUrl}/api/v1/auth/tokens`, { method: 'POST', headers, body: JSON.stringify({ name: 'test' }) });
  return ((await made.json()) as { token: string }).token;
}

/** Starts everything and answers once the API listens. */
export async function startSystem({ workers: workerCount = 1, environment: extra = {} }: SystemOptions = {}): Promise<RunningSystem> {
  const database = await freshDatabase();
  const folder = await mkdtemp(join(tmpdir(), 'leeside-system-'));
  const objectStoreFolder = join(folder, 'objects');
  const redisUrl = new URL(serviceUrl('REDIS_URL'));
  redisUrl.pathname = `/${randomInt(1, redisDatabases + 1)}`;
  const webFolder = join(root, 'apps/web/dist');
  const environment: Record<string, string> = {
    DATABASE_URL: database.url, REDIS_URL: redisUrl.href, OBJECT_STORE_DIR: objectStoreFolder, DATA_DIR: folder, ACCESS_TOKEN_SECRET: 'a secret of the tests, long enough', LOG_LEVEL: 'error', LEESIDE_MODE: 'demo',
    JOB_QUEUE_PREFIX: new URL(database.url).pathname.slice(1), ...(existsSync(webFolder) ? { WEB_DIST: webFolder } : {}), ...extra,
  };
  await seed(database.url);
  let port = 0;
  let api: ChildProcess;
  const workers: ChildProcess[] = [];
  const startApi = async (): Promise<void> => {
    api = startProgram('apps/api/src/start-server.ts', { ...environment, PORT: String(port) });
    port = await listening(api);
  };
  const startWorker = async (): Promise<void> => {
    workers.push(startProgram('apps/worker/src/start-worker.ts', environment));
    await Promise.resolve();
  };
  await startApi();
  for (let at = 0; at < workerCount; at += 1) await startWorker();
  const baseUrl = `http://127.0.0.1:${port}`;
  return {
    baseUrl, databaseUrl: database.url, objectStoreFolder, tokenOf: (account) => makeToken(baseUrl, account), api: () => api, workers: () => workers, startApi, startWorker,
    stop: async () => {
      await Promise.all([end(api), ...workers.map(end)]);
      await database.drop();
      await rm(folder, { recursive: true, force: true });
    },
  };
}
