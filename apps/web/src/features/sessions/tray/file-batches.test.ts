import { expect, test } from 'vitest';
import { fileBatches, sentShares } from './file-batches';

const limits = { fileBytes: 100, requestBytes: 150, filesPerRequest: 2 };
const sizes = (batches: { size: number }[][]) => batches.map((batch) => batch.map(({ size }) => size));

test('files go in their order, in requests within the limits', () => {
  expect(sizes(fileBatches([{ size: 60 }, { size: 90 }, { size: 10 }, { size: 10 }, { size: 10 }], limits).batches)).toEqual([[60, 90], [10, 10], [10]]);
  expect(sizes(fileBatches([{ size: 90 }, { size: 90 }], limits).batches)).toEqual([[90], [90]]);
});
test('a file over the limit is set apart and the others still go', () => {
  const { batches, tooLarge } = fileBatches([{ size: 101 }, { size: 5 }], limits);
  expect(tooLarge).toEqual([{ size: 101 }]);
  expect(sizes(batches)).toEqual([[5]]);
});
test('nothing to send, no request', () => expect(fileBatches([], limits).batches).toEqual([]));
test('progress of each file', () => {
  expect(sentShares([100, 100, 0], 150)).toEqual([1, 0.5, 0]);
  expect(sentShares([100, 100, 0], 240)).toEqual([1, 1, 1]);
});
