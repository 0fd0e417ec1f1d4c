import { describe, expect, test } from 'vitest';
import type { Requirement } from './curve-input.js';
import type { CurveRow } from './fold-repeats.js';
import { judge } from './outcome.js';

const requirement: Requirement = { id: 'r', name: 'at least 50 dB', rule: 'simple', guardFactor: 1, standsForRatio: 1.1, segments: [{ fromHz: 1e8, toHz: 1.2e8, fromDb: 50, toDb: 50 }] };
const row = (frequencyHz: number, attenuationDb: number, more: Partial<CurveRow> = {}): CurveRow => ({
  frequencyHz, attenuationDb, atLeast: false, ceilingDb: 90, excessDb: 0, referenceLevel: 0, enclosedLevel: -attenuationDb, floorLevel: -100, atMostDb: NaN, meanDb: attenuationDb, spreadDb: NaN, worstOf: 0, ...more,
});
const outcomeOf = (rows: readonly CurveRow[], of: Requirement = requirement) => judge(rows, of).outcome;

describe('the simple rule', () => {
  test.each([
    ['50 dB exact', [row(1.1e8, 50)], 'meets'],
    ['0.4 dB short', [row(1.1e8, 49.6)], 'falls short'],
    ['0.4 dB short with an excess of 1 dB', [row(1.1e8, 49.6, { excessDb: 1 })], 'too close to call'],
    ['a bound above', [row(1.1e8, 55, { atLeast: true })], 'meets'],
    ['a bound below', [row(1.1e8, 45, { atLeast: true })], 'beyond reach'],
    ['a bound of 40 dB and an exact 45 dB', [row(1.1e8, 40, { atLeast: true, atMostDb: 45 })], 'falls short'],
    ['a bound of 40 dB and an exact 55 dB', [row(1.1e8, 40, { atLeast: true, atMostDb: 55 })], 'beyond reach'],
    ['one that falls short among many', [row(1.05e8, 60), row(1.1e8, 45, { atLeast: true }), row(1.15e8, 49)], 'falls short'],
  ] as const)('%s', (_name, rows, outcome) => expect(outcomeOf(rows)).toBe(outcome));

  test('what no reading stands for is not measured, and named', () => {
    const wide = { ...requirement, segments: [{ fromHz: 1e8, toHz: 2e8, fromDb: 50, toDb: 50 }] };
    const { outcome, notMeasured } = judge([row(1.1e8, 60), row(1.9e8, 60)], wide);
    expect(outcome).toBe('not all measured');
    expect(notMeasured).toHaveLength(1);
    expect(notMeasured[0]?.fromHz).toBeCloseTo(1.21e8, 0);
    expect(notMeasured[0]?.toHz).toBeCloseTo(1.9e8 / 1.1, 0);
    expect(judge([], wide)).toMatchObject({ outcome: 'not all measured', notMeasured: [{ fromHz: 1e8, toHz: 2e8 }] });
  });

  test('the frequency that decides is the one with the smallest margin', () => {
    expect(judge([row(1.02e8, 60), row(1.1e8, 51), row(1.18e8, 53)], requirement).decidedAtHz).toBe(1.1e8);
  });
});

test('a guarded rule without uncertainty gives no outcome and says why', () => {
  const { outcome, doubts } = judge([row(1.1e8, 90)], { ...requirement, rule: 'guarded' });
  expect([outcome, doubts.map(({ code }) => code)]).toEqual([null, ['no-uncertainty']]);
});

test('segments are straight over log frequency', () => {
  const sloping = { ...requirement, segments: [{ fromHz: 1e8, toHz: 1e10, fromDb: 60, toDb: 40 }], standsForRatio: 10 };
  expect(outcomeOf([row(1e9, 50.01)], sloping)).toBe('meets');
  expect(outcomeOf([row(1e9, 49.99)], sloping)).toBe('falls short');
});
