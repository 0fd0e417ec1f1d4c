import { endpoints } from '@leeside/contracts/endpoints';
import { isAllowed, type Permission } from '@leeside/contracts/permissions';
import type { Role } from '@leeside/contracts/roles';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { accounts, startApi, type Account, type ApiUnderTest, type Browser } from './api-under-test.js';

const nobody = '99999999-9999-4999-8999-999999999999';
const pathOf = (path: string): string => path.replaceAll(/\{\w+\}/g, nobody);
const roleOf = (account: Account): Role => (account.startsWith('client') ? 'client' : (account as Role));
const guarded = endpoints.filter((endpoint) => endpoint.access !== 'public');

describe('the permission table, over every call', () => {
  let api: ApiUnderTest;
  const browsers = new Map<Account, Browser>();
  beforeAll(async () => {
    api = await startApi();
    for (const account of accounts) browsers.set(account, await api.signIn(account));
  });
  afterAll(() => api.close());

  test.each(guarded.map((endpoint) => [`${endpoint.method} ${endpoint.path}`, endpoint] as const))('%s refuses strangers', async (_name, endpoint) => {
    const answer = await request(api.server)[endpoint.method](`/api/v1${pathOf(endpoint.path)}`);
    expect(answer.status).toBe(401);
    expect(answer.headers['content-type']).toContain('application/problem+json');
    expect(answer.body).toMatchObject({ type: '/problems/not-signed-in', status: 401, requestId: expect.any(String) as string });
  });

  const pairs = guarded.flatMap((endpoint) => accounts.map((account) => [`${account}: ${endpoint.method} ${endpoint.path}`, account, endpoint] as const)).filter(([, , endpoint]) => endpoint.name !== 'signOut');
  test.each(pairs)('%s', async (_name, account, endpoint) => {
    const answer = await browsers.get(account)?.call(endpoint.method, pathOf(endpoint.path));
    const wanted = endpoint.access === 'signed in' ? [] : ([endpoint.access].flat() as Permission[]);
    const isGranted = endpoint.access === 'signed in' || wanted.some((permission) => isAllowed([roleOf(account)], permission));
    if (isGranted) expect(answer?.status).not.toBe(403);
    else expect(answer?.status).toBe(403);
    expect(answer?.status).toBeLessThan(500);
  });

  const unsafe = guarded.filter((endpoint) => endpoint.method !== 'get');
  test.each(unsafe.map((endpoint) => [`${endpoint.method} ${endpoint.path}`, endpoint] as const))('%s needs the token of its own session', async (_name, endpoint) => {
    const [mine, other] = [browsers.get('engineer') as Browser, browsers.get('qa') as Browser];
    const call = (headers: Record<string, string>): request.Test => request(api.server)[endpoint.method](`/api/v1${pathOf(endpoint.path)}`).set('Cookie', mine.cookies).set(headers);
    for (const headers of [{}, { 'X-CSRF-Token': other.csrfToken }, { 'X-CSRF-Token': mine.csrfToken, 'Sec-Fetch-Site': 'cross-site' }, { 'X-CSRF-Token': mine.csrfToken, Origin: 'https://elsewhere.example' }]) {
      const answer = await call(headers);
      expect([answer.status, (answer.body as { type: string }).type]).toEqual([403, '/problems/csrf']);
    }
  });
});
