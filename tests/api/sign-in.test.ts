import { randomUUID } from 'node:crypto';
import jwt from 'jsonwebtoken';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { password, startApi, tokenSecret, type ApiUnderTest } from './api-under-test.js';

const email = 'engineer@leeside.example';
const cookiesOf = (answer: request.Response): string[] => [answer.headers['set-cookie'] ?? []].flat();
const valueOf = (cookies: readonly string[], name: string): string => cookies.find((cookie) => cookie.startsWith(`${name}=`))?.split(';')[0] ?? '';

describe('signing in', () => {
  let api: ApiUnderTest;
  beforeAll(async () => {
    api = await startApi();
  });
  afterAll(() => api.close());
  const signIn = (body: object): request.Test => request(api.server).post('/api/v1/auth/sign-in').send(body);
  const me = (cookie: string): request.Test => request(api.server).get('/api/v1/auth/me').set('Cookie', cookie);

  test('gives the person, a token for unsafe calls, and cookies that scripts cannot read', async () => {
    const answer = await signIn({ email: email.toUpperCase(), password });
    expect(answer.status).toBe(200);
    expect(answer.body).toMatchObject({ user: { email, roles: ['engineer'] }, csrfToken: expect.any(String) as string });
    for (const cookie of cookiesOf(answer)) expect(cookie).toMatch(/^(access|refresh)=.*HttpOnly.*SameSite=Lax/);
    expect(cookiesOf(answer)).toHaveLength(2);
  });

  test('answers a wrong password and an unknown person alike', async () => {
    const [wrong, unknown] = [await signIn({ email, password: 'not the password' }), await signIn({ email: 'nobody@leeside.example', password: 'not the password' })];
    const without = ({ body }: request.Response): unknown => ({ ...(body as object), requestId: '' });
    expect([wrong.status, unknown.status]).toEqual([401, 401]);
    expect(without(wrong)).toEqual(without(unknown));
  });

  test('ten failures from one address stop that account there, and not another account', async () => {
    const other = `${randomUUID()}@leeside.example`;
    for (let at = 0; at < 10; at += 1) expect((await signIn({ email: other, password: 'wrong' })).status).toBe(401);
    const stopped = await signIn({ email: other, password: 'wrong' });
    expect([stopped.status, stopped.headers['retry-after']]).toEqual([429, '900']);
    expect((await signIn({ email, password })).status).toBe(200);
  });

  test('signing out ends the session at once, even for a token that has not run out', async () => {
    const browser = await api.signIn('engineer');
    expect((await browser.call('get', '/auth/me')).status).toBe(200);
    expect((await browser.call('post', '/auth/sign-out')).status).toBe(204);
    expect((await browser.call('get', '/auth/me')).status).toBe(401);
  });

  test('twenty tabs that refresh at once stay signed in by one rotation; an old token ends the session', async () => {
    const signed = cookiesOf(await signIn({ email, password }));
    const refresh = (cookie: string): request.Test => request(api.server).post('/api/v1/auth/refresh').set('Cookie', cookie);
    const answers = await Promise.all(Array.from({ length: 20 }, () => refresh(valueOf(signed, 'refresh'))));
    expect(answers.map((answer) => answer.status)).toEqual(Array.from({ length: 20 }, () => 200));
    const successors = new Set(answers.map((answer) => valueOf(cookiesOf(answer), 'refresh')));
    expect(successors.size).toBe(1);
    const [successor = ''] = successors;
    const next = valueOf(cookiesOf(await refresh(successor)), 'refresh');
    expect((await refresh(valueOf(signed, 'refresh'))).status).toBe(401);
    expect((await refresh(next)).status).toBe(200);
    await api.tools.db('sign_in_sessions').update({ rotated_at: new Date(Date.now() - 60_000).toISOString() });
    const latest = await api.tools.db('sign_in_sessions').whereNotNull('previous_hash').whereNull('ended_at').count('* as count').first();
    expect(Number((latest as { count: number }).count)).toBeGreaterThan(0);
    expect((await refresh(next)).status).toBe(401);
    const ended = await api.tools.db('audit_events').where({ action: 'refresh-token-reused' });
    expect(ended).toHaveLength(1);
  });

  test('an access token is accepted only as we make it', async () => {
    const access = valueOf(cookiesOf(await signIn({ email, password })), 'access').replace('access=', '');
    const claims = jwt.decode(access) as { sub: string; sid: string };
    const good = { algorithm: 'HS256', issuer: 'leeside', audience: 'leeside-api', subject: claims.sub, expiresIn: 60 } as const;
    const forge = (payload: object, options: jwt.SignOptions, secret = tokenSecret): string => jwt.sign(payload, secret, options);
    const body = { sid: claims.sid, purpose: 'access' };
    expect((await me(`access=${forge(body, good)}`)).status).toBe(200);
    const { expiresIn: _never, ...endless } = good;
    const forged = [
      forge(body, { ...good, algorithm: 'HS512' }), forge(body, endless), forge({ ...body, purpose: 'refresh' }, good), forge({ sid: claims.sid }, good), forge(body, { ...good, issuer: 'other' }), forge(body, { ...good, audience: 'other' }),
      forge(body, { ...good, expiresIn: -5 }), forge(body, { ...good, subject: randomUUID() }), forge({ ...body, sid: randomUUID() }, good), forge(body, good, 'another secret, also long enough!'),
      `${Buffer.from('{"alg":"none","typ":"JWT"}').toString('base64url')}.${access.split('.')[1]}.`,
    ];
    for (const token of forged) expect((await me(`access=${token}`)).status).toBe(401);
  });

  test('an API token carries its scopes and no more than its person', async () => {
    const engineer = await api.signIn('engineer');
    const make = async (scopes?: string[]): Promise<string> => ((await engineer.call('post', '/auth/tokens').send({ name: 'bench', ...(scopes ? { scopes } : {}) })).body as { token: string }).token;
    const [both, reading] = [await make(), await make(['read'])];
    expect(both).toMatch(/^leeside_[0-9A-Za-z]{49}$/);
    const open = (token: string): request.Test => request(api.server).post('/api/v1/sessions').set('Authorization', `Bearer ${token}`).send({ title: 'By program', heldOn: '2026-11-30' });
    expect([(await open(both)).status, (await open(reading)).status, (await open(`${both.slice(0, -1)}x`)).status]).toEqual([201, 403, 401]);
    const listed = (await engineer.call('get', '/auth/tokens')).body as { items: { id: string; scopes: string[] }[] };
    expect(listed.items.map(({ scopes }) => scopes.length).sort()).toEqual([1, 2]);
    for (const { id } of listed.items) expect((await engineer.call('delete', `/auth/tokens/${id}`)).status).toBe(204);
    expect((await open(both)).status).toBe(401);
    const kept: { token_hash: Buffer }[] = await api.tools.db('api_tokens').select('token_hash');
    for (const { token_hash: hash } of kept) expect(hash.includes(Buffer.from(both.slice(8, 20)))).toBe(false);
  });

  test('passwords are kept as argon2id of the stated cost', async () => {
    const [person]: { password_hash: string }[] = await api.tools.db('people').select('password_hash').limit(1);
    expect(person?.password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });
});
