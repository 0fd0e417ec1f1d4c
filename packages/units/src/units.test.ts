import { describe, expect, test } from 'vitest';
import { formatAttenuation, formatFrequency, formatLevel } from './format-quantity.js';
import { parseFrequency, parseLevel, parseTypedNumber } from './parse-quantity.js';
import { levelDbmFrom, levelDbuvFrom } from './level-unit.js';

describe('numbers as people type them', () => {
  test.each([
    ['2.4 GHz', 2.4e9], ['2,4 GHz', 2.4e9], ['433.92M', 433.92e6], ['915e6', 915e6], ['10k', 10e3],
    ['abc', null], ['', null], ['1.234.5', null], ['-5 MHz', null],
  ])('frequency %s', (text, hz) => expect(parseFrequency(text)).toBe(hz));
  test.each([['-31 dBm', -31], ['−31,5', -31.5], ['64', 64], ['64 dB', null]])('level %s', (text, dbm) =>
    expect(parseLevel(text, 'dBm')).toBe(dbm));
  test.each([['0x10', null], ['1e400', null], [' 7 ', 7], ['1_000', null], ['.5', 0.5], ['5.', 5]])('number %s', (text, value) =>
    expect(parseTypedNumber(text)).toBe(value));
});

describe('how numbers are shown', () => {
  test('a bound carries its mark, a minus is a real minus', () => {
    expect(formatAttenuation(64, true)).toBe('≥\u200964.0\u2009dB');
    expect(formatLevel(-31, 'dBm')).toBe('\u221231.0\u2009dBm');
    expect(formatLevel(-0.01, 'dB')).toBe('0.0\u2009dB');
  });
  test.each([[433.92e6, '433.92\u2009MHz'], [1.2e9, '1.2\u2009GHz'], [999, '999\u2009Hz'], [100e3, '100\u2009kHz']])('%s Hz', (hz, text) =>
    expect(formatFrequency(hz)).toBe(text));
});

test('volts and decibels over a volt agree', () => {
  expect(levelDbmFrom(1, 'mV', 50)).toBeCloseTo(levelDbmFrom(60, 'dBµV', 50), 12);
  expect(levelDbmFrom(2, 'µW', 50)).toBeCloseTo(levelDbmFrom(0.002, 'mW', 50), 12);
  expect(levelDbmFrom(levelDbuvFrom(-47.3, 75), 'dBµV', 75)).toBeCloseTo(-47.3, 12);
});
