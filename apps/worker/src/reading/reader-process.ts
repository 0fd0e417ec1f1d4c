import { createHash } from 'node:crypto';
import { openFolderStore } from '@leeside/object-store/folder-store';
import { startReading } from '@leeside/trace-reading/read-trace-file';
import type { ReadingAnswer, ReadingRequest } from './reading-message.js';

/** Reads one stored file chunk by chunk, checking its hash on the way. */
async function read(request: ReadingRequest): Promise<ReadingAnswer> {
  const store = await openFolderStore(request.storeFolder);
  const stream = await store.openStream(request.key);
  if (stream === null) return { kind: 'missing' };
  const reader = startReading({ fileName: request.fileName, impedanceOhm: request.impedanceOhm, answers: request.answers });
  const hash = createHash('sha256');
  let byteCount = 0;
  for await (const chunk of stream as AsyncIterable<Buffer>) {
    hash.update(chunk);
    byteCount += chunk.length;
    reader.push(chunk);
  }
  const found = hash.digest('hex');
  if (found !== request.sha256 || byteCount !== request.byteCount) return { kind: 'damaged', found };
  return { kind: 'reading', reading: reader.finish() };
}

process.on('message', (request: ReadingRequest) => {
  void read(request).then((answer) => process.send?.(answer, undefined, undefined, (fault) => {
    // The worker is gone: nobody waits for the answer.
    if (fault !== null) process.exit(1);
  }));
});
process.on('disconnect', () => process.exit(0));
