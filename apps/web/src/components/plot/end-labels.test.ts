import { expect, test } from 'vitest';
import { lastValue, placeEndLabels } from './end-labels';

const label = (text: string, y: number) => ({ text, colour: 'ink', y });

test('labels that would cover one another are moved apart in their order', () => {
  const placed = placeEndLabels([label('floor', 102), label('enclosed', 100)], 14, 0, 300);
  expect(placed.map(({ text, y }) => [text, y])).toEqual([['enclosed', 100], ['floor', 114]]);
});
test('none is pushed out of the plot', () => {
  const placed = placeEndLabels([label('a', 298), label('b', 299), label('c', 300)], 14, 0, 300);
  expect(placed.map(({ y }) => y)).toEqual([272, 286, 300]);
});
test('the end of a series is its last value inside the window', () => {
  expect(lastValue([1, 2, 3, 4], [5, 6, null, 8], 3)).toBe(6);
  expect(lastValue([1], [null], 3)).toBeNull();
});
