import { readFile } from 'node:fs/promises';
import { basename } from 'node:path';
import { readTraceBytes } from '@leeside/trace-reading/read-trace-file';
import type { TraceReading } from '@leeside/trace-reading/transcription';
import { formatFrequency } from '@leeside/units/format-quantity';
import { CommandFault, exitCode } from './exit-code.js';

/** Reads a file as the server would. */
export async function readLocally(path: string): Promise<TraceReading> {
  const bytes = await readFile(path).catch((cause: unknown) => {
    throw new CommandFault(`${path} cannot be opened: ${cause instanceof Error ? cause.message : 'no reason given'}`);
  });
  return readTraceBytes(new Uint8Array(bytes), { fileName: basename(path) });
}

/** The exit code that a reading deserves. */
export function codeOfReading(reading: TraceReading): number {
  if (reading.kind === 'read') return exitCode.done;
  return reading.kind === 'question' ? exitCode.needsAnswer : exitCode.refused;
}

function linesOfOutcome(reading: TraceReading): string[] {
  if (reading.kind === 'refused') {
    const { line, column, code, message } = reading.problem;
    const place = line === undefined ? '' : ` (line ${line}${column === undefined ? '' : `, column ${column}`})`;
    return [`refused${place}: ${message} [${code}]`];
  }
  if (reading.kind === 'question') {
    return reading.questions.flatMap((question) => [
      `needs an answer: ${question.message}`,
      ...question.choices.map((choice) => `  ${choice.label}: ${choice.sample.replaceAll('\n', ' / ')}`),
    ]);
  }
  return reading.sweeps.map(({ name, sweep }) => {
    const first = formatFrequency(sweep.frequencyHz[0] ?? NaN);
    const last = formatFrequency(sweep.frequencyHz.at(-1) ?? NaN);
    return `${name}: ${sweep.level.length} points, ${first} to ${last}, ${sweep.levelUnit}`;
  });
}

/** A reading in plain lines: what came out, by what each thing was decided, and what is doubted. */
export function describeReading(reading: TraceReading): string {
  const decided = Object.entries(reading.transcription?.decidedBy ?? {}).map(([what, how]) => `  ${what}: ${how}`);
  const settings = Object.entries(reading.transcription?.settings ?? {}).map(([what, value]) => `  ${what}: ${String(value)}`);
  return [
    ...linesOfOutcome(reading),
    ...(decided.length > 0 ? ['decided by', ...decided] : []),
    ...(settings.length > 0 ? ['settings', ...settings] : []),
    ...reading.doubts.map((doubt) => `${doubt.weight}: ${doubt.message}`),
  ].join('\n');
}
