import { once } from 'node:events';
import type { Server } from 'node:http';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { buildApp } from '../../apps/api/src/build-app.js';
import type { ApiTools } from '../../apps/api/src/api-tools.js';
import { hashPassword } from '../../apps/api/src/authentication/passwords.js';
import { readDemoManifest } from '../../apps/api/src/demo/demo-manifest.js';
import { seedDemoLab } from '../../apps/api/src/demo/seed-demo-lab.js';
import { openTools } from '../../apps/api/src/open-tools.js';
import request from 'supertest';
import { freshDatabase, serviceUrl } from '../journeys/fresh-database.js';

export const password = 'a-password-of-the-demo';
export const accounts = ['engineer', 'analyst', 'qa', 'admin', 'client-a', 'client-b'] as const;
export type Account = (typeof accounts)[number];

/** The API in this process, on a database and a store of its own, with the demo lab seeded. */
export interface ApiUnderTest {
  readonly tools: ApiTools;
  readonly server: Server;
  readonly folder: string;
  /** Somebody's browser: cookies and the token that unsafe calls carry. */
  signIn(account: Account): Promise<Browser>;
  close(): Promise<void>;
}
export interface Browser {
  readonly cookies: string;
  readonly csrfToken: string;
  call(method: 'get' | 'post' | 'patch' | 'put' | 'delete', path: string): request.Test;
}

export const tokenSecret = 'a secret of the tests, long enough';

export async function startApi(): Promise<ApiUnderTest> {
  const database = await freshDatabase();
  const folder = await mkdtemp(join(tmpdir(), 'leeside-api-'));
  const redisUrl = new URL(serviceUrl('REDIS_URL'));
  redisUrl.pathname = '/14';
  const { tools, close } = await openTools({
    databaseUrl: database.url, redisUrl: redisUrl.href, objectStoreFolder: join(folder, 'objects'), dataFolder: folder, port: 0, baseUrl: 'http://127.0.0.1', tokenSecret, mode: 'demo', webFolder: null, demoPassword: password, logLevel: 'silent',
  });
  await seedDemoLab(tools.db, await readDemoManifest(), await hashPassword(password));
  const server = buildApp(tools).listen(0, '127.0.0.1');
  await once(server, 'listening');
  const signIn = async (account: Account): Promise<Browser> => {
    const answer = await request(server).post('/api/v1/auth/sign-in').send({ email: `${account}@leeside.example`, password });
    const cookies = [answer.headers['set-cookie'] ?? []].flat().map((cookie: string) => cookie.split(';')[0]).join('; ');
    const { csrfToken } = answer.body as { csrfToken: string };
    return { cookies, csrfToken, call: (method, path) => request(server)[method](`/api/v1${path}`).set('Cookie', cookies).set('X-CSRF-Token', csrfToken) };
  };
  return {
    tools, server, folder, signIn,
    close: async () => {
      await new Promise((resolve) => server.close(resolve));
      await close();
      await database.drop();
      await rm(folder, { recursive: true, force: true });
    },
  };
}
