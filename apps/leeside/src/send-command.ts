import { getFile } from '@leeside/contracts/files';
import { listSamples } from '@leeside/contracts/samples';
import type { Connection } from './configuration.js';
import { CommandFault, exitCode } from './exit-code.js';
import { filesOfFolder, isSettled, type FolderFile } from './folder-files.js';
import { sendFiles, type SendingFields, type SentFile } from './send-files.js';
import { askServer, untilServerAnswers } from './server-call.js';

const filesPerRequest = 50;
const bytesPerRequest = 64 * 1024 * 1024;
const restMs = 500;
const rest = (): Promise<void> => new Promise((resolve) => setTimeout(resolve, restMs));

export interface SendOptions {
  readonly folder: string;
  readonly sessionId: string;
  readonly role?: string;
  readonly sampleCode?: string;
  readonly condition?: string;
  readonly watch: boolean;
  readonly say: (words: string) => void;
  readonly stopped: () => boolean;
}

export interface SendReport {
  readonly files: { name: string; id: string; state: string; problem?: string }[];
  readonly code: number;
}

async function sampleIdOf(connection: Connection, code: string): Promise<string> {
  const page = await askServer(connection, `/samples?code=${encodeURIComponent(code)}`, listSamples.answers[200]);
  const sample = page.items.find((one) => one.code === code);
  if (!sample) throw new CommandFault(`There is no sample with the code ${code}.`);
  return sample.id;
}

/** The next files that fit one request. */
function nextBatch(files: readonly FolderFile[]): FolderFile[] {
  const batch: FolderFile[] = [];
  let byteCount = 0;
  for (const file of files.slice(0, filesPerRequest)) {
    byteCount += file.byteCount;
    if (batch.length > 0 && byteCount > bytesPerRequest) break;
    batch.push(file);
  }
  return batch;
}

/** A file is known by its name and time: one that is written anew is sent anew. */
const markOf = (file: FolderFile): string => `${file.name}\n${file.byteCount}\n${file.changedAtMs}`;

async function sendWaiting(connection: Connection, options: SendOptions, fields: SendingFields, sent: Map<string, SentFile>): Promise<number> {
  const now = Date.now();
  const waiting = (await filesOfFolder(options.folder)).filter((file) => !sent.has(markOf(file)) && (!options.watch || isSettled(file, now)));
  for (let left = waiting; left.length > 0;) {
    const batch = nextBatch(left);
    const answers = await untilServerAnswers(() => sendFiles(connection, options.sessionId, batch, fields), options.say);
    batch.forEach((file, at) => {
      const answer = answers[at];
      if (answer) sent.set(markOf(file), answer);
    });
    options.say(`${sent.size} sent${waiting.length > batch.length ? `, ${left.length - batch.length} to go` : ''}`);
    left = left.slice(batch.length);
  }
  return waiting.length;
}

type ReadFile = SendReport['files'][number];

/** What became of a file; null while it waits or is being read. */
async function stateOf(connection: Connection, { id, name }: Pick<SentFile, 'id' | 'name'>, say: (words: string) => void): Promise<ReadFile | null> {
  const file = await untilServerAnswers(() => askServer(connection, `/files/${id}`, getFile.answers[200]), say);
  if (file.state === 'waiting' || file.state === 'reading') return null;
  const words = file.problem?.message ?? file.questions?.[0]?.message;
  return { name, id, state: file.state, ...(words === undefined ? {} : { problem: words }) };
}

async function waitUntilRead(connection: Connection, say: (words: string) => void, sent: readonly SentFile[]): Promise<ReadFile[]> {
  const read: ReadFile[] = [];
  let unread = [...new Map(sent.map((file) => [file.id, file])).values()];
  while (unread.length > 0) {
    const states = await Promise.all(unread.map((file) => stateOf(connection, file, say)));
    read.push(...states.filter((state) => state !== null));
    unread = unread.filter((_, at) => states[at] === null);
    if (unread.length > 0) await rest();
  }
  return read;
}

/** Sends a folder and waits until each file is read; with `watch` it goes on until it is stopped. */
export async function sendFolder(connection: Connection, options: SendOptions): Promise<SendReport> {
  const fields: SendingFields = {
    ...(options.role === undefined ? {} : { role: options.role }),
    ...(options.sampleCode === undefined ? {} : { sampleId: await sampleIdOf(connection, options.sampleCode) }),
    ...(options.condition === undefined ? {} : { condition: options.condition }),
  };
  const sent = new Map<string, SentFile>();
  do {
    const count = await sendWaiting(connection, options, fields, sent);
    if (options.watch && count === 0) await rest();
  } while (options.watch && !options.stopped());
  const files = await waitUntilRead(connection, options.say, [...sent.values()]);
  const has = (state: string): boolean => files.some((file) => file.state === state);
  return { files, code: has('refused') ? exitCode.refused : has('needs answer') ? exitCode.needsAnswer : exitCode.done };
}
