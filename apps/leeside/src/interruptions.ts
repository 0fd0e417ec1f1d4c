export interface Interruptions {
  /** Aborted by the first Ctrl-C. */
  readonly stopping: AbortSignal;
  /** Aborted by the second. A third ends the program without a word. */
  readonly leaving: AbortSignal;
}

/** Listens for Ctrl-C: the first lets what is under way come to its end, the second does not wait for it. */
export function listenForInterruptions(say: (words: string) => void): Interruptions {
  const stopping = new AbortController();
  const leaving = new AbortController();
  process.once('SIGINT', () => {
    say('Stopping: what is under way is finished first. Ctrl-C again ends at once.');
    stopping.abort();
    process.once('SIGINT', () => leaving.abort());
  });
  return { stopping: stopping.signal, leaving: leaving.signal };
}
