import { endpoints } from '@leeside/contracts/endpoints';
import type { Router } from 'express';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { apiRouter } from '../../apps/api/src/build-app.js';
import { startApi, type ApiUnderTest } from './api-under-test.js';

interface Layer {
  readonly route?: { readonly path: string; readonly methods: Readonly<Record<string, boolean>> };
}

/** What a router really holds. */
function mounted(router: Router): string[] {
  return (router.stack as unknown as Layer[]).flatMap(({ route }) => (route === undefined ? [] : Object.keys(route.methods).map((method) => `${method} ${route.path.replaceAll(/:(\w+)/g, '{$1}')}`))).sort();
}

describe('router and document', () => {
  let api: ApiUnderTest;
  beforeAll(async () => {
    api = await startApi();
  });
  afterAll(() => api.close());

  test('the router holds the calls of the contract, and none besides the document itself', () => {
    const wanted = endpoints.map(({ method, path }) => `${method} ${path}`);
    expect(mounted(apiRouter(api.tools))).toEqual([...wanted, 'get /openapi.json'].sort());
  });

  test('the document lists the calls of the contract, each with its answers', async () => {
    const { body } = await request(api.server).get('/api/v1/openapi.json');
    const { openapi, paths } = body as { openapi: string; paths: Record<string, Record<string, { operationId: string; responses: Record<string, unknown> }>> };
    expect(openapi).toBe('3.1.0');
    const listed = Object.entries(paths).flatMap(([path, methods]) => Object.entries(methods).map(([method, { operationId }]) => `${operationId} ${method} ${path}`));
    expect(listed.sort()).toEqual(endpoints.map(({ name, method, path }) => `${name} ${method} ${path}`).sort());
    for (const { path, method, answers } of endpoints) expect(Object.keys(paths[path]?.[method]?.responses ?? {})).toEqual(expect.arrayContaining([...Object.keys(answers), 'default']));
  });

  test.each([
    ['get', '/api/v1/nothing-here', 404], ['get', '/api/elsewhere', 404], ['get', '/nowhere', 404], ['get', '/api/v1/limits?surprise=1', 400],
  ] as const)('%s %s answers a problem', async (method, path, status) => {
    const answer = await request(api.server)[method](path);
    expect(answer.status).toBe(status);
    expect(answer.headers['content-type']).toContain('application/problem+json');
    expect(answer.headers['x-request-id']).toBe((answer.body as { requestId: string }).requestId);
  });

  test('a body that is no JSON, or of another type, is refused in words', async () => {
    const post = (): request.Test => request(api.server).post('/api/v1/auth/sign-in');
    const malformed = await post().set('Content-Type', 'application/json').send('{"email":');
    expect([malformed.status, (malformed.body as { type: string }).type]).toEqual([400, '/problems/malformed-json']);
    const other = await post().set('Content-Type', 'text/plain').send('hello');
    expect(other.status).toBe(415);
    const extra = await post().send({ email: 'a@b.example', password: 'x', remember: true });
    expect([extra.status, (extra.body as { errors: unknown[] }).errors.length]).toEqual([400, 1]);
  });

  test('every answer carries the headers that keep strangers out', async () => {
    for (const path of ['/api/v1/limits', '/api/v1/nothing-here', '/livez', '/nowhere']) {
      const { headers } = await request(api.server).get(path);
      expect(headers['content-security-policy']).toContain("default-src 'none'");
      expect(headers['content-security-policy']).not.toContain('unsafe');
      expect(headers).toMatchObject({ 'x-content-type-options': 'nosniff', 'referrer-policy': 'no-referrer', 'cross-origin-opener-policy': 'same-origin' });
      expect(headers['x-powered-by']).toBeUndefined();
    }
  });

  test('operators are told how it stands', async () => {
    expect((await request(api.server).get('/livez')).status).toBe(200);
    const ready = await request(api.server).get('/readyz');
    expect([ready.status, ready.body]).toEqual([200, { status: 'ok', checks: { database: 'ok', store: 'ok', queue: 'ok' } }]);
  });
});
