import { createHash } from 'node:crypto';
import { uploadFiles } from '@leeside/contracts/files';
import type { z } from 'zod';
import type { Connection } from './configuration.js';
import { bytesOf, type FolderFile } from './folder-files.js';
import { callServer } from './server-call.js';

export interface SendingFields {
  readonly role?: string;
  readonly sampleId?: string;
  readonly condition?: string;
}

const answerSchema = uploadFiles.answers[202];
export type SentFile = z.infer<typeof answerSchema>['items'][number];

/**
 * Sends a batch in one request. The key is made from the bytes, so that a batch whose answer was lost and is sent
 * again is answered as it was the first time.
 */
export async function sendFiles(connection: Connection, sessionId: string, files: readonly FolderFile[], fields: SendingFields): Promise<SentFile[]> {
  const form = new FormData();
  const key = createHash('sha256').update(JSON.stringify([sessionId, fields]));
  for (const [name, value] of Object.entries(fields) as [string, string][]) form.append(name, value);
  for (const file of files) {
    const { bytes, sha256 } = await bytesOf(file);
    key.update(`${file.name}\n${sha256}\n`);
    form.append('file', new Blob([bytes]), file.name);
  }
  const response = await callServer(connection, `/sessions/${encodeURIComponent(sessionId)}/files`, {
    method: 'POST', body: form, headers: { 'Idempotency-Key': key.digest('hex') },
  });
  return answerSchema.parse(await response.json()).items;
}
