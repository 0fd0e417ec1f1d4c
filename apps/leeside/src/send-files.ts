import { createHash } from 'node:crypto';
import { uploadFiles } from '@leeside/contracts/files';
import type { z } from 'zod';
import type { FileBytes, FolderFile } from './folder-files.js';
import { callServer, readAnswer, type ServerLine } from './server-call.js';

export interface SendingFields {
  readonly role?: string;
  readonly sampleId?: string;
  readonly condition?: string;
}

const answerSchema = uploadFiles.answers[202];
export type SentFile = z.infer<typeof answerSchema>['items'][number];

/** One request, ready to be sent as often as it takes. */
export interface Parcel {
  readonly path: string;
  readonly body: FormData;
  readonly key: string;
  readonly byteCount: number;
}

/**
 * Packs files into one request. The key is made from what is in it, so that a request whose answer was lost and
 * that is sent again is answered as it was the first time.
 */
export function packFiles(sessionId: string, files: readonly (FolderFile & FileBytes)[], fields: SendingFields): Parcel {
  const body = new FormData();
  const key = createHash('sha256').update(JSON.stringify([sessionId, fields, files.map(({ name, sha256 }) => [name, sha256])])).digest('hex');
  for (const [name, value] of Object.entries(fields) as [string, string][]) body.append(name, value);
  for (const { name, bytes } of files) body.append('file', new Blob([bytes]), name);
  return { path: `/sessions/${encodeURIComponent(sessionId)}/files`, body, key, byteCount: files.reduce((sum, file) => sum + file.byteCount, 0) };
}

/** Sends a parcel; the server answers with one item for each file, in their order. */
export async function sendParcel(line: ServerLine, { path, body, key, byteCount }: Parcel): Promise<SentFile[]> {
  const answer = await callServer(line, path, { method: 'POST', body, byteCount, headers: { 'Idempotency-Key': key } });
  return readAnswer(line, answer, answerSchema).items;
}
