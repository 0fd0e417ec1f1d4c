import { expect, test } from 'vitest';
import { runsOf } from './runs';

test('a column falls into its unbroken stretches', () => {
  expect(runsOf([null, 1, 2, null, 3])).toEqual([{ first: 1, last: 2 }, { first: 4, last: 4 }]);
  expect(runsOf([null, null])).toEqual([]);
  expect(runsOf([1])).toEqual([{ first: 0, last: 0 }]);
});
