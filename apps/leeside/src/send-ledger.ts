import type { FileState } from '@leeside/contracts/file-states';
import { exitCode } from './exit-code.js';
import { markOf, type FolderFile } from './folder-files.js';

/** What became of a file. Without an id it is not known to be stored. */
export interface FileOutcome {
  readonly name: string;
  readonly id: string | null;
  readonly state: FileState | 'not sent' | 'not confirmed';
  readonly problem?: string;
}

/** What is known about the files of a folder. */
export interface SendLedger {
  /** By the file's mark, so that a file that is written anew stands beside what it was before. */
  readonly outcomes: Map<string, FileOutcome>;
  /** The stored files that are to be looked at, the next one first. */
  unreadIds: string[];
}

export const openLedger = (): SendLedger => ({ outcomes: new Map(), unreadIds: [] });

/** Writes down what became of a file; what was never stored under its name is forgotten. */
export function noteOutcome({ outcomes }: SendLedger, file: FolderFile, outcome: Omit<FileOutcome, 'name'>): void {
  for (const [mark, earlier] of outcomes) if (earlier.name === file.name && earlier.id === null) outcomes.delete(mark);
  outcomes.set(markOf(file), { name: file.name, ...outcome });
}

/** Whether a file, as it is now, is stored. */
export function isStored({ outcomes }: SendLedger, file: FolderFile): boolean {
  return (outcomes.get(markOf(file))?.id ?? null) !== null;
}

/** The exit code that the outcomes deserve: the worst one speaks. */
export function codeOfOutcomes(outcomes: readonly FileOutcome[]): number {
  const has = (...states: FileOutcome['state'][]): boolean => outcomes.some(({ state }) => states.includes(state));
  if (has('not sent', 'not confirmed')) return exitCode.failed;
  if (has('refused')) return exitCode.refused;
  return has('needs answer') ? exitCode.needsAnswer : exitCode.done;
}
