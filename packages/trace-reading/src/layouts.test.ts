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

describe('layouts, each read as it is meant', () => {
  test.each(layoutSamples.map((sample) => [sample.name, sample] as const))('%s', (_name, sample) => {
    const reading = readTraceBytes(bytesOf(sample), { fileName: sample.fileName });
    const { expected } = sample;
    if ('question' in expected) {
      expect(reading.kind === 'question' ? reading.questions.map(({ id }) => id) : reading).toEqual([expected.question]);
      return;
    }
    if (reading.kind !== 'read') throw new Error(JSON.stringify(reading));
    const [first] = reading.sweeps;
    expect(reading.sweeps).toHaveLength(expected.sweeps ?? 1);
    expect(first?.sweep.levelUnit).toBe(expected.unit);
    expect([...(first?.sweep.frequencyHz ?? [])]).toEqual(expected.frequencyHz.map((hz) => expect.closeTo(hz, 3) as number));
    expect([...(first?.sweep.level ?? [])]).toEqual(expected.level.map((level) => expect.closeTo(level, 4) as number));
  });

  const questions = layoutSamples.filter(({ expected }) => 'question' in expected);
  test.each(questions.map((sample) => [sample.name, sample] as const))('every choice of "%s" leads to a reading', (_name, sample) => {
    expect(readingAfterAnswers(sample, []).kind).toBe('read');
  });
});
