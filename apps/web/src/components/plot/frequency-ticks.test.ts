import { describe, expect, test } from 'vitest';
import { frequencyTicks } from './frequency-ticks';

describe('ticks of a logarithmic axis', () => {
  test('one, two and five in every decade', () => {
    expect(frequencyTicks({ fromHz: 30e6, toHz: 3e9 }, 'log', 12)).toEqual([50e6, 100e6, 200e6, 500e6, 1e9, 2e9]);
  });
  test('only decades where there is little room', () => {
    expect(frequencyTicks({ fromHz: 100e3, toHz: 10e9 }, 'log', 6)).toEqual([100e3, 1e6, 10e6, 100e6, 1e9, 10e9]);
  });
  test('even steps inside a part of one decade', () => {
    expect(frequencyTicks({ fromHz: 2.4e9, toHz: 2.5e9 }, 'log', 6)).toEqual([2.4e9, 2.42e9, 2.44e9, 2.46e9, 2.48e9, 2.5e9]);
  });
});

test('a linear axis has even round steps inside its window', () => {
  const ticks = frequencyTicks({ fromHz: 30e6, toHz: 3e9 }, 'linear', 7);
  expect(ticks).toEqual([500e6, 1e9, 1.5e9, 2e9, 2.5e9, 3e9]);
});

test('never more ticks than there is room for', () => {
  for (const most of [4, 6, 10]) expect(frequencyTicks({ fromHz: 9e3, toHz: 40e9 }, 'log', most).length).toBeLessThanOrEqual(Math.max(most, 7));
});
