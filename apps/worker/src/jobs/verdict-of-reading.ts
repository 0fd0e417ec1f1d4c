import type { FileVerdict } from '@leeside/database/file-reading-store';
import type { ReadSweep } from '@leeside/trace-reading/transcription';
import { ReaderCrashed } from '../reading/reader-pool.js';
import type { ReadingAnswer } from '../reading/reading-message.js';

export interface FileOutcome {
  readonly verdict: FileVerdict;
  readonly sweeps: readonly ReadSweep[];
}

const refused = (code: string, message: string): FileOutcome => ({ verdict: { state: 'refused', doubts: [], problem: { code, message } }, sweeps: [] });

/** What a reader's answer means for the file. */
export function outcomeOfAnswer(answer: ReadingAnswer): FileOutcome {
  if (answer.kind === 'missing') return refused('object-missing', 'The stored file is missing. It can be read again once it is back.');
  if (answer.kind === 'damaged') return refused('object-damaged', `The stored file is damaged: its bytes have SHA-256 ${answer.found} and not the one they came with.`);
  const { reading } = answer;
  if (reading.kind === 'read') return { verdict: { state: 'read', transcription: reading.transcription, doubts: [...reading.doubts] }, sweeps: reading.sweeps };
  if (reading.kind === 'question') {
    const questions = reading.questions.map((question) => ({ ...question, lines: [...question.lines], choices: [...question.choices] }));
    return { verdict: { state: 'needs answer', transcription: reading.transcription, doubts: [...reading.doubts], questions }, sweeps: [] };
  }
  return { verdict: { state: 'refused', transcription: reading.transcription, doubts: [...reading.doubts], problem: reading.problem }, sweeps: [] };
}

/** A reader that died twice over a file refuses it; any other fault is not the file's. */
export function outcomeOfCrash(fault: unknown): FileOutcome {
  if (!(fault instanceof ReaderCrashed)) throw fault;
  return refused('reader-crashed', `${fault.message} Twice. The file can be read again.`);
}
