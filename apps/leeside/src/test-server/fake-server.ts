import { createHash } from 'node:crypto';
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import { buffer } from 'node:stream/consumers';
import { setTimeout as sleep } from 'node:timers/promises';
import type { FileState } from '@leeside/contracts/file-states';

export interface StoredFile {
  readonly id: string;
  readonly sessionId: string;
  readonly name: string;
  readonly sha256: string;
  readonly bytes: number;
  /** How many looks it takes until the file is read. */
  looksLeft: number;
}

/** How a request meets its end instead of an answer. */
export type Mishap = 'no answer' | 'not ready' | 'cut before storing' | 'reply lost' | 'reply cut';

export interface FakeServer {
  readonly url: string;
  readonly stored: StoredFile[];
  readonly counts: { uploads: number; answeredFromKey: number; duplicates: number; mishaps: Record<Mishap, number> };
  /** The mishap of the next request, asked before each. */
  mishapOf: (request: IncomingMessage) => Mishap | null;
  /** How a file ends up, by its name. */
  stateOf: (name: string) => Extract<FileState, 'read' | 'refused' | 'needs answer'> | 'never read';
  goAway: () => Promise<void>;
  comeBack: () => Promise<void>;
}

interface Reply {
  readonly status: number;
  readonly body: unknown;
}

const uuidOf = (number: number): string => `00000000-0000-4000-8000-${String(number).padStart(12, '0')}`;
const problem = (status: number, slug: string, detail: string): Reply => ({
  status, body: { type: `/problems/${slug}`, title: 'As told', status, detail, instance: '/', requestId: 'r' },
});

const listen = (server: Server, port: number): Promise<void> => new Promise((resolve, reject) => {
  server.once('error', reject);
  server.listen(port, '127.0.0.1', () => resolve());
});

function storeFile(fake: FakeServer, sessionId: string, name: string, bytes: Buffer): unknown {
  const sha256 = createHash('sha256').update(bytes).digest('hex');
  const known = fake.stored.find((file) => file.sessionId === sessionId && file.sha256 === sha256);
  if (known) fake.counts.duplicates += 1;
  const file = known ?? { id: uuidOf(fake.stored.length + 1), sessionId, name, sha256, bytes: bytes.length, looksLeft: 2 };
  if (!known) fake.stored.push(file);
  return { id: file.id, name: file.name, sha256, state: 'waiting', ...(known ? { duplicateOf: known.id } : {}) };
}

async function takeFiles(fake: FakeServer, answers: Map<string, Reply>, request: IncomingMessage, sessionId: string): Promise<Reply> {
  const body = await buffer(request);
  const form = await new Response(body, { headers: { 'Content-Type': request.headers['content-type'] ?? '' } }).formData();
  fake.counts.uploads += 1;
  const key = String(request.headers['idempotency-key'] ?? '');
  const answered = answers.get(key);
  if (answered) {
    fake.counts.answeredFromKey += 1;
    return answered;
  }
  const files = form.getAll('file').filter((part) => typeof part !== 'string');
  if (files.some((file) => file.name.startsWith('bad-'))) return problem(400, 'malformed-upload', 'The form is malformed.');
  const items: unknown[] = [];
  for (const file of files) items.push(storeFile(fake, sessionId, file.name, Buffer.from(await file.arrayBuffer())));
  const reply = { status: 202, body: { items } };
  answers.set(key, reply);
  return reply;
}

function describeFile(fake: FakeServer, id: string): Reply {
  const file = fake.stored.find((one) => one.id === id);
  if (!file) return problem(404, 'not-found', 'There is no such file.');
  file.looksLeft -= 1;
  const end = fake.stateOf(file.name);
  const state = file.looksLeft > 0 || end === 'never read' ? 'reading' : end;
  const { sessionId, name, sha256, bytes } = file;
  return { status: 200, body: {
    id, sessionId, name, sha256, bytes, state, uploadedAt: '2026-01-01T00:00:00.000Z', setAsideAt: null, doubts: [], traces: [],
    ...(state === 'refused' ? { problem: { code: 'empty', message: `${name} holds no sweep.` } } : {}),
  } };
}

async function replyTo(fake: FakeServer, answers: Map<string, Reply>, request: IncomingMessage): Promise<Reply> {
  if (request.headers.authorization !== 'Bearer right') return problem(401, 'not-signed-in', 'The token is not known.');
  const [, sessionId] = /^\/api\/v1\/sessions\/([^/]+)\/files$/.exec(request.url ?? '') ?? [];
  if (sessionId !== undefined && request.method === 'POST') return takeFiles(fake, answers, request, sessionId);
  const [, fileId] = /^\/api\/v1\/files\/([^/]+)$/.exec(request.url ?? '') ?? [];
  return fileId === undefined ? problem(404, 'not-found', 'Nothing lies here.') : describeFile(fake, fileId);
}

async function answer(fake: FakeServer, answers: Map<string, Reply>, request: IncomingMessage, response: ServerResponse): Promise<void> {
  const mishap = fake.mishapOf(request);
  if (mishap !== null) fake.counts.mishaps[mishap] += 1;
  if (mishap === 'no answer') return;
  if (mishap === 'cut before storing') return void request.socket.destroy();
  const reply = mishap === 'not ready' ? problem(503, 'not-ready', 'The database cannot be reached.') : await replyTo(fake, answers, request);
  if (mishap === 'reply lost') return void request.socket.destroy();
  const text = JSON.stringify(reply.body);
  response.writeHead(reply.status, { 'Content-Type': 'application/json', 'Content-Length': Buffer.byteLength(text) });
  if (mishap !== 'reply cut') return void response.end(text);
  response.write(text.slice(0, text.length / 2));
  await sleep(2);
  request.socket.destroy();
}

/** A server that keeps files as the contract says, and can go away in every way that a server goes away. */
export async function startFakeServer(): Promise<FakeServer> {
  const answers = new Map<string, Reply>();
  const open = (): Server => createServer((request, response) => {
    request.on('error', () => undefined);
    answer(fake, answers, request, response).catch(() => request.socket.destroy());
  });
  let server = open();
  await listen(server, 0);
  const { port } = server.address() as AddressInfo;
  const fake: FakeServer = {
    url: `http://127.0.0.1:${port}`, stored: [],
    counts: { uploads: 0, answeredFromKey: 0, duplicates: 0, mishaps: { 'no answer': 0, 'not ready': 0, 'cut before storing': 0, 'reply lost': 0, 'reply cut': 0 } },
    mishapOf: () => null, stateOf: () => 'read',
    goAway: () => new Promise((resolve) => {
      server.close(() => resolve());
      server.closeAllConnections();
    }),
    comeBack: async () => {
      server = open();
      await listen(server, port);
    },
  };
  return fake;
}
