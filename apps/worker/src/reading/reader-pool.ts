import { fork, type ChildProcess } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import type { ReadingAnswer, ReadingRequest } from './reading-message.js';

/** The reader died or took too long; it was replaced, and the worker goes on. */
export class ReaderCrashed extends Error {}

const longestReadingMs = 60_000;
const heapMegabytes = 512;

const entry = fileURLToPath(new URL(import.meta.url.endsWith('.ts') ? './reader-process.ts' : './reader-process.js', import.meta.url));

function startReader(): ChildProcess {
  return fork(entry, [], {
    serialization: 'advanced', env: {}, execArgv: [...process.execArgv.filter((word) => !word.startsWith('--watch') && !word.startsWith('--env-file')), `--max-old-space-size=${heapMegabytes}`],
    stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
  });
}

/** Reader processes, one a file at a time: a file that kills its reader kills nothing else. */
export interface ReaderPool {
  read(request: ReadingRequest): Promise<ReadingAnswer>;
  close(): void;
}

function ask(reader: ChildProcess, request: ReadingRequest): Promise<ReadingAnswer> {
  return new Promise((resolve, reject) => {
    const settle = (finish: () => void) => (): void => {
      clearTimeout(timer);
      reader.off('message', onMessage).off('exit', onExit).off('error', onExit);
      finish();
    };
    const onMessage = (answer: ReadingAnswer): void => settle(() => resolve(answer))();
    const onExit = (): void => settle(() => reject(new ReaderCrashed('The reader process ended while it read the file.')))();
    const timer = setTimeout(settle(() => {
      reader.kill('SIGKILL');
      reject(new ReaderCrashed('The reader process took longer than a minute.'));
    }), longestReadingMs);
    reader.on('message', onMessage).once('exit', onExit).once('error', onExit);
    reader.send(request);
  });
}

/** Opens a pool; readers start when they are first needed and are used again. */
export function openReaderPool(): ReaderPool {
  const idle: ChildProcess[] = [];
  const all = new Set<ChildProcess>();
  const take = (): ChildProcess => {
    const waiting = idle.pop();
    if (waiting !== undefined && waiting.connected) return waiting;
    const reader = startReader();
    all.add(reader);
    reader.once('exit', () => {
      all.delete(reader);
      const place = idle.indexOf(reader);
      if (place >= 0) idle.splice(place, 1);
    });
    return reader;
  };
  return {
    read: async (request) => {
      const reader = take();
      const answer = await ask(reader, request);
      idle.push(reader);
      return answer;
    },
    close: () => all.forEach((reader) => reader.kill('SIGKILL')),
  };
}
