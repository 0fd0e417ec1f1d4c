import { expect, test } from 'vitest';
import { checkLevel, levelOrNull, levelText } from './typed-decibels';

test('empty is allowed and means nothing stated', () => {
  expect(checkLevel('dB', -200, 200)(' ')).toBeNull();
  expect(levelOrNull('dB')('')).toBeNull();
});
test('what is no number is quoted; what is out of range names the range', () => {
  expect(checkLevel('dBm', -200, 100)('ten')).toBe('Not a number in dBm: “ten”.');
  expect(checkLevel('dBm', -200, 100)('120')).toBe('Must lie from \u2212200 to 100 dBm.');
  expect(checkLevel('dBm', -200, 100)('−31,5 dBm')).toBeNull();
});
test('what is shown can be read again', () => expect(levelOrNull('dB')(levelText(-2.5))).toBe(-2.5));
