import type { CurvePointsBody } from '@leeside/contracts/curves';
import { expect, test } from 'vitest';
import { chosenRows, readingAloud, readingAt } from './cursor-reading';

const points: CurvePointsBody = {
  frequencyHz: [1e8, 2.4e9], attenuationDb: [64, 47.5], atLeast: [true, false], atMostDb: [null, null], ceilingDb: [64, 62],
  expandedUncertaintyDb: [null, 2], requiredDb: [50, 50],
};

test('the margin is the attenuation less what is required', () => {
  expect(readingAt(points, 1)).toMatchObject({ hz: 2.4e9, marginDb: -2.5, atLeast: false, uncertaintyDb: 2 });
  expect(readingAt({ ...points, requiredDb: [null, null] }, 1)?.marginDb).toBeNull();
});
test('outside the points there is nothing to read', () => {
  expect(readingAt(points, -1)).toBeNull();
  expect(readingAt(points, 2)).toBeNull();
});
test('a bound is said to be one, and so is its margin', () => {
  const reading = readingAt(points, 0);
  expect(reading && readingAloud(reading, 'en')).toBe('100\u2009MHz: attenuation at least 64.0\u2009dB, ceiling 64.0\u2009dB, required 50.0\u2009dB, margin at least 14.0\u2009dB.');
});
test('rows by choice', () => {
  expect(chosenRows(points, 'all')).toEqual([0, 1]);
  expect(chosenRows(points, 'bounds')).toEqual([0]);
  expect(chosenRows(points, 'below')).toEqual([1]);
});
