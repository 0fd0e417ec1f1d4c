import { problemOf } from '../../../api-client/api-problem';
import { uploadFiles, type UploadFieldTexts } from '../../../api-client/upload-files';
import { fileBatches, sentShares } from './file-batches';

export interface LocalUpload {
  key: string;
  sessionId: string;
  name: string;
  phase: 'queued' | 'sending' | 'stored' | 'not sent';
  sentShare: number;
  fileId: string | null;
  duplicate: boolean;
  trouble: string | null;
  again: (() => void) | null;
}

let uploads: readonly LocalUpload[] = [];
const listeners = new Set<() => void>();
let nextKey = 0;

const publish = (next: readonly LocalUpload[]): void => {
  uploads = next;
  listeners.forEach((listener) => listener());
};
const change = (keys: readonly string[], changeOf: (upload: LocalUpload, at: number) => Partial<LocalUpload>): void =>
  publish(uploads.map((upload) => (keys.includes(upload.key) ? { ...upload, ...changeOf(upload, keys.indexOf(upload.key)) } : upload)));

/** Uploads outlive the page that started them, as long as the tab is open. */
export const uploadStore = {
  get: (): readonly LocalUpload[] => uploads,
  subscribe: (listener: () => void): (() => void) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
  drop: (keys: readonly string[]): void => publish(uploads.filter((upload) => !keys.includes(upload.key))),
};

const begin = (sessionId: string, file: File): LocalUpload => {
  nextKey += 1;
  return { key: String(nextKey), sessionId, name: file.name, phase: 'queued', sentShare: 0, fileId: null, duplicate: false, trouble: null, again: null };
};

async function sendBatch(sessionId: string, files: readonly File[], keys: readonly string[], fields: UploadFieldTexts): Promise<void> {
  const sizes = files.map((file) => file.size);
  change(keys, () => ({ phase: 'sending', trouble: null, again: null }));
  try {
    const { items } = await uploadFiles({
      sessionId, files, fields,
      onSent: (sentBytes) => {
        const shares = sentShares(sizes, sentBytes);
        change(keys, (_, at) => ({ sentShare: shares[at] ?? 0 }));
      },
    });
    change(keys, (_, at) => ({ phase: 'stored', sentShare: 1, fileId: items[at]?.id ?? null, duplicate: items[at]?.duplicateOf !== undefined }));
  } catch (failure) {
    const trouble = problemOf(failure).detail;
    change(keys, () => ({ phase: 'not sent', sentShare: 0, trouble, again: () => void sendBatch(sessionId, files, keys, fields) }));
  }
}

/** Sends files into a session, one request after the other. */
export async function startUpload(sessionId: string, files: readonly File[], fields: UploadFieldTexts): Promise<void> {
  const { batches, tooLarge } = fileBatches(files);
  const rows = batches.map((batch) => batch.map((file) => ({ file, upload: begin(sessionId, file) })));
  const refused = tooLarge.map((file): LocalUpload => ({ ...begin(sessionId, file), phase: 'not sent', trouble: 'Larger than 64 MiB: not sent. Split it or export fewer points.' }));
  publish([...uploads, ...rows.flat().map(({ upload }) => upload), ...refused]);
  for (const row of rows) await sendBatch(sessionId, row.map(({ file }) => file), row.map(({ upload }) => upload.key), fields);
}
