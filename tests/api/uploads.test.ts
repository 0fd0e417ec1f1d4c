import { createHash } from 'node:crypto';
import { readdir } from 'node:fs/promises';
import { connect, type AddressInfo } from 'node:net';
import { join } from 'node:path';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { startApi, type ApiUnderTest, type Browser } from './api-under-test.js';

const sweep = Buffer.from('Frequency [MHz],Level [dBm]\n100,-31.5\n200,-32.5\n');
const boundary = 'parts-of-a-form';
type Part = { name: string; fileName?: string; body: Buffer | string };
const field = (name: string, body: string): Part => ({ name, body });
const file = (fileName: string, body: Buffer | string = sweep): Part => ({ name: 'file', fileName, body });

function formOf(parts: readonly Part[], ending = `--${boundary}--\r\n`): Buffer {
  return Buffer.concat([...parts.flatMap(({ name, fileName, body }) => [
    Buffer.from(`--${boundary}\r\nContent-Disposition: form-data; name="${name}"${fileName === undefined ? '' : `; filename="${fileName}"\r\nContent-Type: application/octet-stream`}\r\n\r\n`), Buffer.from(body), Buffer.from('\r\n'),
  ]), Buffer.from(ending)]);
}

interface Item {
  id: string;
  name: string;
  sha256: string;
  state: string;
  duplicateOf?: string;
}

describe('bringing files in', () => {
  let api: ApiUnderTest;
  let engineer: Browser;
  let sessionId: string;
  beforeAll(async () => {
    api = await startApi();
    engineer = await api.signIn('engineer');
  });
  afterAll(() => api.close());
  beforeEach(async () => {
    const opened = await engineer.call('post', '/sessions').send({ title: 'Uploads', heldOn: '2026-11-30' });
    sessionId = (opened.body as { id: string }).id;
  });

  const send = (body: Buffer, headers: Record<string, string> = {}) => engineer.call('post', `/sessions/${sessionId}/files`).set({ 'Content-Type': `multipart/form-data; boundary=${boundary}`, ...headers }).send(body);
  const items = async (parts: readonly Part[]): Promise<Item[]> => ((await send(formOf(parts))).body as { items: Item[] }).items;
  const sessionFiles = async (): Promise<unknown[]> => ((await engineer.call('get', `/sessions/${sessionId}`)).body as { files: unknown[] }).files;
  const temporaries = (): Promise<string[]> => readdir(join(api.folder, 'objects', 'temporary'));
  const slugOf = (body: unknown): string => (body as { type: string }).type.replace('/problems/', '');

  async function expectRefused(answer: { status: number; body: unknown }, status: number, slug: string): Promise<void> {
    expect([answer.status, slugOf(answer.body)]).toEqual([status, slug]);
    expect(await sessionFiles()).toEqual([]);
    expect(await temporaries()).toEqual([]);
  }

  test('the bytes are kept as they came, under their hash', async () => {
    const [item] = await items([field('role', 'reference'), file('ref.csv')]);
    expect(item).toMatchObject({ name: 'ref.csv', state: 'waiting', sha256: createHash('sha256').update(sweep).digest('hex') });
    const raw = await engineer.call('get', `/files/${item?.id}/raw`).responseType('blob');
    expect(raw.headers['content-disposition']).toBe('attachment; filename="ref.csv"; filename*=UTF-8\'\'ref.csv');
    expect(Buffer.compare(raw.body as Buffer, sweep)).toBe(0);
    expect(await temporaries()).toEqual([]);
  });

  test('a field describes the files after it until it is repeated, and an empty one clears it', async () => {
    const other = (level: number): string => `Frequency [MHz],Level [dBm]\n100,${level}\n200,${level}\n`;
    const sent = await items([field('role', 'enclosed'), field('condition', 'folded twice'), file('a.csv', other(-1)), file('b.csv', other(-2)), field('condition', ''), field('role', 'noise'), file('c.csv', other(-3)), field('role', ''), file('d.csv', other(-4))]);
    const rows: { name: string; fields: unknown }[] = await api.tools.db('files').whereIn('id', sent.map(({ id }) => id)).orderBy('upload_order').select('name', 'fields');
    expect(rows.map(({ fields }) => fields)).toEqual([{ role: 'enclosed', condition: 'folded twice' }, { role: 'enclosed', condition: 'folded twice' }, { role: 'noise' }, {}]);
  });

  test('the same bytes again are answered with the first file, in one request and in the next', async () => {
    const [first, again] = await items([file('one.csv'), file('two.csv')]);
    expect(again).toMatchObject({ id: first?.id, duplicateOf: first?.id });
    const [later] = await items([file('three.csv')]);
    expect(later).toMatchObject({ id: first?.id, name: 'one.csv', duplicateOf: first?.id });
    expect(await sessionFiles()).toHaveLength(1);
  });

  test.each([
    ['fields after the last file', formOf([file('a.csv'), field('role', 'noise')]), 400, 'fields-after-last-file'],
    ['an unknown field', formOf([field('colour', 'red'), file('a.csv')]), 400, 'unknown-field'],
    ['the field __proto__', formOf([field('__proto__', 'x'), file('a.csv')]), 400, 'unknown-field'],
    ['the field constructor', formOf([field('constructor', 'x'), file('a.csv')]), 400, 'unknown-field'],
    ['an unknown role', formOf([field('role', 'spare'), file('a.csv')]), 400, 'invalid-field'],
    ['a file under another name', formOf([{ name: 'upload', fileName: 'a.csv', body: sweep }]), 400, 'unknown-field'],
    ['no file at all', formOf([field('role', 'noise')]), 400, 'no-file'],
    ['a form that is cut off', formOf([file('a.csv')], ''), 400, 'upload-incomplete'],
    ['201 files', formOf(Array.from({ length: 201 }, (_, at) => file(`${at}.csv`, `${at}`))), 400, 'too-many-files'],
    ['2,001 fields', formOf([...Array.from({ length: 2001 }, () => field('role', 'noise')), file('a.csv')]), 400, 'too-many-fields'],
    ['a sample of nobody', formOf([field('role', 'enclosed'), field('sampleId', '99999999-9999-4999-8999-999999999999'), file('a.csv')]), 422, 'unknown-reference'],
  ] as const)('%s: %#', async (_name, body, status, slug) => expectRefused(await send(body), status, slug));

  test('a file over the limit refuses the whole request', async () => {
    await expectRefused(await send(formOf([file('small.csv'), file('large.csv', Buffer.alloc(64 * 1024 * 1024 + 1, '1'))])), 413, 'too-large');
  }, 60_000);

  test('another type of body, no boundary, or an encoding is refused', async () => {
    await expectRefused(await send(sweep, { 'Content-Type': 'text/csv' }), 415, 'unsupported-media-type');
    await expectRefused(await send(formOf([file('a.csv')]), { 'Content-Type': 'multipart/form-data' }), 415, 'unsupported-media-type');
    await expectRefused(await send(formOf([file('a.csv')]), { 'Content-Encoding': 'gzip' }), 415, 'unsupported-encoding');
  });

  test('a digest that the bytes do not meet refuses them', async () => {
    const body = formOf([file('a.csv')]);
    const digest = (of: Buffer): string => `sha-256=:${createHash('sha256').update(of).digest('base64')}:`;
    await expectRefused(await send(body, { 'Content-Digest': digest(sweep) }), 422, 'checksum-mismatch');
    expect((await send(body, { 'Content-Digest': digest(body) })).status).toBe(202);
  });

  test.each([
    ['../../etc/passwd', 'passwd'], ['C:\\\\x\\\\y.csv', 'y.csv'], ['a\u202evsc.exe', 'avsc.exe'], ['<img src=x onerror=alert(1)>.csv', '<img src=x onerror=alert(1)>.csv'], ['', 'unnamed'], [`${'x'.repeat(400)}.csv`, 'x'.repeat(200)], ['e\u0301t\u00e9.csv', '\u00e9t\u00e9.csv'],
  ])('the name %j is shown as %j', async (sent, shown) => {
    const [item] = await items([file(sent)]);
    expect(item?.name).toBe(shown);
  });

  test('a client that goes away in the middle leaves nothing', async () => {
    const { port } = api.server.address() as AddressInfo;
    const head = formOf([file('a.csv', Buffer.alloc(500_000, '1'))], '');
    for (let round = 0; round < 20; round += 1) {
      await new Promise<void>((resolve) => {
        const socket = connect(port, '127.0.0.1', () => {
          socket.write(`POST /api/v1/sessions/${sessionId}/files HTTP/1.1\r\nHost: 127.0.0.1:${port}\r\nCookie: ${engineer.cookies}\r\nX-CSRF-Token: ${engineer.csrfToken}\r\nContent-Type: multipart/form-data; boundary=${boundary}\r\nContent-Length: ${head.length * 2}\r\n\r\n`);
          socket.write(head, () => setTimeout(() => socket.destroy(), 5 * round));
        });
        socket.on('close', () => resolve());
        socket.on('error', () => undefined);
      });
    }
    await expect.poll(temporaries, { timeout: 10_000 }).toEqual([]);
    expect(await sessionFiles()).toEqual([]);
  });

  test('a request sent twice with the same key is done once; with another payload it is refused', async () => {
    const key = { 'Idempotency-Key': `key-${sessionId}` };
    const [one, two] = await Promise.all([send(formOf([file('a.csv')]), key), send(formOf([file('a.csv')]), key)]);
    expect([one.status, two.status]).toEqual([202, 202]);
    expect(two.body).toEqual(one.body);
    expect((await send(formOf([file('b.csv', 'Frequency [MHz],Level [dBm]\n1,2\n')]), key)).status).toBe(422);
    expect(await sessionFiles()).toHaveLength(1);
  });

  test('a session of nobody is not found', async () => {
    const answer = await engineer.call('post', '/sessions/99999999-9999-4999-8999-999999999999/files').set('Content-Type', `multipart/form-data; boundary=${boundary}`).send(formOf([file('a.csv')]));
    expect(answer.status).toBe(404);
  });
});
