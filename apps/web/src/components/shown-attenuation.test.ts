import { expect, test } from 'vitest';
import { attenuationInWords, shownAttenuation } from './shown-attenuation';

test('a bound is cut and an exact value is rounded', () => {
  expect(shownAttenuation(57.26, true, 'en')).toBe('≥\u200957.2\u2009dB');
  expect(shownAttenuation(57.26, false, 'en')).toBe('57.3\u2009dB');
});
test('a bound of whole tenths stays what it is, float32 noise or not', () => {
  expect(shownAttenuation(Math.fround(57.3), true, 'en')).toBe('≥\u200957.3\u2009dB');
  expect(shownAttenuation(-3, true, 'en')).toBe('≥\u2009\u22123.0\u2009dB');
});
test('in words', () => expect(attenuationInWords(64, true, 'en')).toBe('at least 64.0\u2009dB'));
