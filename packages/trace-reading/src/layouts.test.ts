import { describe, expect, test } from 'vitest';
import { layoutSamples, type LayoutSample } from '../../../sample-data/layouts/layout-samples.js';
import { readTraceBytes } from './read-trace-file.js';
import type { TraceReading } from './transcription.js';

function utf16(text: string, isBigEndian: boolean): Uint8Array {
  const bytes = new Uint8Array(text.length * 2);
  const view = new DataView(bytes.buffer);
  for (let at = 0; at < text.length; at += 1) view.setUint16(at * 2, text.charCodeAt(at), !isBigEndian);
  return bytes;
}

function bytesOf({ text, encoding = 'utf-8' }: LayoutSample): Uint8Array {
  switch (encoding) {
    case 'utf-8': return new TextEncoder().encode(text);
    case 'utf-16le with mark': return utf16(`\ufeff${text}`, false);
    case 'utf-16be with mark': return utf16(`\ufeff${text}`, true);
    case 'utf-16le': return utf16(text, false);
    case 'windows-1252': return Uint8Array.from(text, (sign) => sign.charCodeAt(0));
  }
}

/** Answers whatever is asked with its first choice until the file is read. */
function readingAfterAnswers(sample: LayoutSample, answers: readonly { questionId: string; choiceId: string }[]): TraceReading {
  const reading = readTraceBytes(bytesOf(sample), { fileName: sample.fileName, answers });
  if (reading.kind !== 'question' || answers.length > 4) return reading;
  const [question] = reading.questions;
  const [choice] = question?.choices ?? [];
  if (question === undefined || choice === undefined) throw new Error('A question without a choice.');
  expect(question.lines.length).toBeGreaterThan(0);
  for (const { sample: shown } of question.choices) expect(shown).not.toBe('');
  return readingAfterAnswers(sample, [...answers, { questionId: question.id, choiceId: choice.id }]);
}

/** What came out, in the words of the expectation. */
function outcomeOf(reading: TraceReading): unknown {
  if (reading.kind === 'question') return { question: reading.questions[0]?.id };
  if (reading.kind === 'refused') return { refusal: reading.problem.code, line: reading.problem.line };
  const [first] = reading.sweeps;
  return { unit: first?.sweep.levelUnit, frequencyHz: [...(first?.sweep.frequencyHz ?? [])], level: [...(first?.sweep.level ?? [])], sweeps: reading.sweeps.length };
}

/** The expectation, with numbers as close as float32 levels and computed axes can be. */
function wanted({ expected }: LayoutSample): object {
  if (!('unit' in expected)) return expected;
  const { frequencyHz, level, sweeps = 1 } = expected;
  return { ...expected, sweeps, frequencyHz: frequencyHz.map((hz) => expect.closeTo(hz, 3) as number), level: level.map((one) => expect.closeTo(one, 4) as number) };
}

describe('layouts, each read as it is meant', () => {
  test.each(layoutSamples.map((sample) => [sample.name, sample] as const))('%s', (_name, sample) => {
    expect(outcomeOf(readTraceBytes(bytesOf(sample), { fileName: sample.fileName }))).toMatchObject(wanted(sample));
  });

  const questions = layoutSamples.filter(({ expected }) => 'question' in expected);
  test.each(questions.map((sample) => [sample.name, sample] as const))('every choice of "%s" leads to a reading', (_name, sample) => {
    expect(readingAfterAnswers(sample, []).kind).toBe('read');
  });
});
