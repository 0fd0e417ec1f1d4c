import { expect, test } from 'vitest';
import { alignedFrequencies } from './aligned-frequencies';

test('decimal marks stand under one another', () => {
  expect(alignedFrequencies([433.92e6, 3e9, 999], 'en')).toEqual(['433.92\u2009MHz', '3\u00a0\u00a0\u00a0\u2009GHz', '999\u00a0\u00a0\u00a0\u2009\u00a0Hz']);
  expect(alignedFrequencies([], 'en')).toEqual([]);
});
