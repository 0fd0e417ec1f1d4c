import { describe, expect, test } from 'vitest';
import { brokenFixtures, goodFixtures } from '../../../sample-data/layouts/all-fixtures.js';
import type { Fixture } from '../../../sample-data/layouts/fixture.js';
import type { TrueSweep } from '../../../sample-data/layouts/true-sweep.js';
import { readTraceBytes } from './read-trace-file.js';
import type { TraceReading } from './transcription.js';

type Answers = { questionId: string; choiceId: string }[];
const readingOf = ({ file, bytes }: Fixture, answers: Answers = []): TraceReading => readTraceBytes(bytes(), { fileName: file, answers });

/** Files that the reader does not yet bring to their outcome: it refuses or asks where it need not, or lacks a doubt or a setting. */
const notYet: ReadonlySet<string> = new Set([
  'quoted-decimal-commas-between-commas.csv', 'comment-sign-and-colon.txt', 'quoted-keys.csv', 'automatic-and-manual.csv', 'notes-of-a-person.txt', 'german-decimal-commas.csv',
  'french-tabs.txt', 'all-levels-on-one-line.txt', 'version-2-lower-half.ts', 'third-column-zero.csv', 'time-of-each-row-first.csv', 'status-word-last.csv',
  'names-over-two-lines-in-quotes.csv', 'too-many-rows.csv', 'unclosed-quote.csv', 'field-too-long.csv', 'last-row-cut.csv', 'setting-twice.csv', 'equal-names.csv',
  'lines-between-the-rows.csv', 'grids-that-differ.csv', 'comma-parts-and-marks.csv', 'comma-parts-and-marks-without-names.csv', 'too-small-a-number.csv', 'frequency-twice.csv',
  'below-one-hertz.csv', 'date-of-two-readings.csv', 'date-with-two-digits-of-the-year.csv', 'serial-rounded-by-a-spreadsheet.csv', 'values-over-range.csv',
  'marker-contradicts-the-unit.csv',
]);
const isDone = ({ file }: Fixture): boolean => !notYet.has(file);
const isOpen = ({ file }: Fixture): boolean => notYet.has(file);

/** Everything a reading must be equal to, and nothing that words may change. */
function expectSweeps(reading: TraceReading, sweeps: readonly TrueSweep[]): void {
  if (reading.kind !== 'read') throw new Error(JSON.stringify(reading.kind === 'refused' ? reading.problem : reading.questions, null, 1));
  expect(reading.sweeps.map(({ sweep }) => sweep.levelUnit)).toEqual(sweeps.map(({ unit }) => unit));
  reading.sweeps.forEach(({ sweep }, at) => {
    const truth = sweeps[at];
    expect(sweep.frequencyHz).toHaveLength(truth?.frequencyHz.length ?? -1);
    truth?.frequencyHz.forEach((hz, row) => expect(Math.abs((sweep.frequencyHz[row] ?? NaN) - hz), `row ${row}: ${sweep.frequencyHz[row]} Hz, truly ${hz} Hz`).toBeLessThanOrEqual(1e-9 * hz));
    expect([...sweep.level]).toEqual(truth?.level.map((level) => Math.fround(level)));
  });
}

describe('good files are read to their true axis and levels', () => {
  const expectGood = (fixture: Fixture): void => {
    const reading = readingOf(fixture);
    if (fixture.expected.kind !== 'read') return;
    expectSweeps(reading, fixture.expected.sweeps);
    expect(reading.kind === 'read' && reading.sweeps[0]?.sweep.settings).toMatchObject(fixture.expected.settings ?? {});
    expect(reading.doubts.map(({ code }) => code)).toEqual(expect.arrayContaining([...(fixture.expected.doubts ?? [])]));
  };
  const good = goodFixtures.filter(({ expected }) => expected.kind === 'read');
  test.each(good.filter(isDone).map((fixture) => [fixture.file, fixture] as const))('%s', (_file, fixture) => expectGood(fixture));
  test.fails.each(good.filter(isOpen).map((fixture) => [fixture.file, fixture] as const))('not yet: %s', (_file, fixture) => expectGood(fixture));

  test.each(good.filter(isOpen).map((fixture) => [fixture.file, fixture] as const))('%s is at least never read with other numbers', (_file, fixture) => {
    const reading = readingOf(fixture);
    if (reading.kind === 'read' && fixture.expected.kind === 'read') expectSweeps(reading, fixture.expected.sweeps);
    else expect(['question', 'refused']).toContain(reading.kind);
  });

  test('and nine of ten of them without a question', () => {
    const asking = goodFixtures.filter(({ expected }) => expected.kind !== 'read');
    expect(asking.length / goodFixtures.length).toBeLessThan(0.1);
    expect(goodFixtures.length).toBeGreaterThanOrEqual(60);
  });
});

describe('files with a fault or in doubt come to their outcome', () => {
  const inDoubt = [...brokenFixtures, ...goodFixtures.filter(({ expected }) => expected.kind !== 'read')];
  const expectOutcome = (fixture: Fixture): void => {
    const reading = readingOf(fixture);
    const { expected } = fixture;
    if (expected.kind === 'read') {
      expectSweeps(reading, expected.sweeps);
      expect(reading.doubts.map(({ code }) => code)).toEqual(expect.arrayContaining([...(expected.doubts ?? [])]));
      return;
    }
    expect(placeOf(reading)).toMatchObject({ kind: expected.kind, code: expected.code, ...(expected.line === undefined ? {} : { line: expected.line }) });
  };
  test.each(inDoubt.filter(isDone).map((fixture) => [fixture.file, fixture] as const))('%s', (_file, fixture) => expectOutcome(fixture));
  test.fails.each(inDoubt.filter(isOpen).map((fixture) => [fixture.file, fixture] as const))('not yet: %s', (_file, fixture) => expectOutcome(fixture));
});

/** Kind, code and line of what was refused or asked. */
function placeOf(reading: TraceReading): { kind: string; code: string | undefined; line: number | undefined } {
  if (reading.kind === 'refused') return { kind: 'refused', code: reading.problem.code, line: reading.problem.line };
  const question = reading.kind === 'question' ? reading.questions[0] : undefined;
  return { kind: reading.kind, code: question?.code, line: question?.lines[0] };
}

describe('answers lead where their choice says', () => {
  const answered = brokenFixtures.filter(isDone).flatMap((fixture) => (fixture.expected.kind === 'question' ? (fixture.expected.answered ?? []).map((answer) => ({ fixture, answer })) : []));
  test.each(answered.map((one) => [`${one.fixture.file}: ${one.answer.choiceId}`, one] as const))('%s', (_name, { fixture, answer }) => {
    const asked = readingOf(fixture);
    if (asked.kind !== 'question') throw new Error(asked.kind);
    const [question] = asked.questions;
    expect(question?.choices.map(({ id }) => id)).toContain(answer.choiceId);
    expectSweeps(readingOf(fixture, [{ questionId: question?.id ?? '', choiceId: answer.choiceId }]), answer.sweeps);
  });
});
