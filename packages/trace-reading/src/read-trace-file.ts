import { decodeBytes } from './decode-bytes.js';
import { openNotebook, type Notebook } from './notebook.js';
import { OpenQuestion, refuse, Refusal } from './reading-fault.js';
import { readingLimits } from './reading-limits.js';
import { readTable } from './read-table.js';
import { isTouchstone, readTouchstone } from './touchstone.js';
import { lineAt, splitLines, type TextLines } from './text-lines.js';
import type { ReadSweep, TraceReading } from './transcription.js';
import { isTransposed, turnTable } from './transposed-table.js';
import { isWideSweep, readWideSweeps } from './wide-sweeps.js';

/** What is known of a file besides its bytes. */
export interface ReadingOptions {
  readonly fileName: string;
  /** Across which voltages stand, \u03a9; 50 unless told. */
  readonly impedanceOhm?: number;
  readonly answers?: readonly { questionId: string; choiceId: string }[];
}

/** A reader that takes a file piece by piece. */
export interface TraceReader {
  push(chunk: Uint8Array): void;
  finish(): TraceReading;
}

/**
 * Reads a whole file.
 * @param bytes the file as it came.
 * @param options name, impedance, and answers that a person gave.
 * @returns sweeps with how each thing was decided, a question, or a refusal with its place; never an exception for what a file holds.
 * @example readTraceBytes(new TextEncoder().encode('Frequency [MHz],Level [dBm]\n100,-31.5\n200,-32.5\n'), { fileName: 'sweep.csv' })
 */
export function readTraceBytes(bytes: Uint8Array, options: ReadingOptions): TraceReading {
  const notebook = openNotebook(options.answers ?? []);
  try {
    const sweeps = readSweeps(notebook, bytes, options);
    return { kind: 'read', sweeps, transcription: notebook.transcription, doubts: notebook.doubts };
  } catch (fault) {
    if (fault instanceof Refusal) return { kind: 'refused', problem: fault.problem, doubts: notebook.doubts, transcription: notebook.transcription };
    if (fault instanceof OpenQuestion) return { kind: 'question', questions: [fault.question], transcription: notebook.transcription, doubts: notebook.doubts };
    throw fault;
  }
}

function readSweeps(notebook: Notebook, bytes: Uint8Array, { fileName, impedanceOhm = 50 }: ReadingOptions): ReadSweep[] {
  if (bytes.length > readingLimits.fileBytes) throw refuse('too-large', `The file has ${bytes.length} bytes; the limit is ${readingLimits.fileBytes}.`);
  const text = decodeBytes(notebook, bytes);
  const lines = splitLines(text);
  refuseEmpty(lines);
  if (isTouchstone(lines, fileName)) return readTouchstone(notebook, lines, fileName);
  if (isWideSweep(lines)) return readWideSweeps(notebook, lines);
  return readTable(notebook, isTransposed(lines) ? turnTable(notebook, lines) : lines, impedanceOhm);
}

function refuseEmpty(lines: TextLines): void {
  for (let line = 0; line < lines.count; line += 1) {
    const text = lineAt(lines, line).trim();
    if (text !== '' && !/^(?:[#!%]|\/\/)/.test(text)) return;
  }
  throw refuse('empty-file', 'The file holds nothing but blanks and comments.');
}

/**
 * Takes a file piece by piece.
 * @param options name, impedance, and answers that a person gave.
 */
export function startReading(options: ReadingOptions): TraceReader {
  const chunks: Uint8Array[] = [];
  let byteCount = 0;
  return {
    push: (chunk) => {
      byteCount += chunk.length;
      if (byteCount <= readingLimits.fileBytes) chunks.push(chunk.slice());
    },
    finish: () => {
      if (byteCount > readingLimits.fileBytes) return { kind: 'refused', problem: { code: 'too-large', message: `The file has ${byteCount} bytes; the limit is ${readingLimits.fileBytes}.` }, doubts: [] };
      const bytes = new Uint8Array(byteCount);
      let place = 0;
      for (const chunk of chunks) {
        bytes.set(chunk, place);
        place += chunk.length;
      }
      chunks.length = 0;
      return readTraceBytes(bytes, options);
    },
  };
}
