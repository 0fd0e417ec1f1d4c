import { expect, test } from 'vitest';
import { decibelRange, decibelTicks, extentOf } from './decibel-range';

test('values, ceiling and requirement all fit, with air', () => {
  expect(decibelRange([[61, 72, null], [80, NaN], [50]])).toEqual({ least: 40, most: 90 });
});
test('a flat line still has room around it', () => {
  const { least, most } = decibelRange([[50, 50]]);
  expect(most - least).toBeGreaterThanOrEqual(20);
});
test('nothing at all gives a range to show an empty plot', () => expect(decibelRange([[null]])).toEqual({ least: 0, most: 100 }));
test('no value has no extent', () => expect(extentOf([[null, NaN]])).toBeNull());
test('ticks are whole fives or tens and as many as fit', () => {
  expect(decibelTicks({ least: 40, most: 90 }, 6)).toEqual([40, 50, 60, 70, 80, 90]);
  expect(decibelTicks({ least: -115, most: 0 }, 6)).toEqual([-100, -80, -60, -40, -20, 0]);
});
