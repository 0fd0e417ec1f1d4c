import fc from 'fast-check';
import { expect, test } from 'vitest';
import { selectRank } from './select-rank.js';

test('every rank of any numbers is the one that sorting gives', () => {
  fc.assert(fc.property(fc.array(fc.double({ noNaN: true, noDefaultInfinity: true }), { minLength: 1, maxLength: 60 }), (numbers) => {
    const sorted = Float64Array.from(numbers).sort();
    sorted.forEach((value, rank) => expect(selectRank(Float64Array.from(numbers), rank) === value).toBe(true));
  }));
});
