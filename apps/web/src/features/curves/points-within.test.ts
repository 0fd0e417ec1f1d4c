import { expect, test } from 'vitest';
import { pointsWithin } from './points-within';

const none = [null, null, null];
const points = { frequencyHz: [1, 2, 3], attenuationDb: [10, 20, 30], atLeast: [true, false, false], atMostDb: none, ceilingDb: none, expandedUncertaintyDb: none, requiredDb: none };

test('only what lies in the window, every column alike', () => {
  const within = pointsWithin(points, { fromHz: 1.5, toHz: 3 });
  expect([within.frequencyHz, within.attenuationDb, within.atLeast, within.ceilingDb]).toEqual([[2, 3], [20, 30], [false, false], [null, null]]);
});
test('a window between two points holds none', () => {
  expect(pointsWithin(points, { fromHz: 2.2, toHz: 2.8 }).frequencyHz).toEqual([]);
  expect(pointsWithin(points, { fromHz: 5, toHz: 6 }).frequencyHz).toEqual([]);
});
test('without a window all of them', () => expect(pointsWithin(points, null)).toBe(points));
