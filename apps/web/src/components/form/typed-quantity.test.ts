import { describe, expect, test } from 'vitest';
import { optionalLevel, optionalNumber, typedFrequency, typedLevel } from './typed-quantity';

describe('a frequency as it is typed', () => {
  test.each([['2.4 GHz', 2.4e9], ['2,4 GHz', 2.4e9], ['433.92M', 433.92e6], ['1000', 1000]])('%s is understood', (text, hz) =>
    expect(typedFrequency('Frequency').parse(text)).toBe(hz));
  test('what is not understood is quoted', () => {
    const answer = typedFrequency('Frequency').safeParse('2.4.1 GHz');
    expect(answer.error?.issues[0]?.message).toBe('Frequency must be a frequency such as 433.92 MHz. Found “2.4.1 GHz”.');
  });
  test('an empty field says what to write', () => {
    expect(typedFrequency('Frequency').safeParse(' ').error?.issues[0]?.message).toBe('Frequency is missing. Write for example 433.92 MHz.');
  });
});

describe('a level as it is typed', () => {
  test.each([['-31 dBm', -31], ['−31,5', -31.5], ['-107.25', -107.25]])('%s is understood', (text, dbm) =>
    expect(typedLevel('Level', 'dBm').parse(text)).toBe(dbm));
  test('another unit is refused, not taken for this one', () => {
    expect(typedLevel('Level', 'dBm').safeParse('60 dBµV').success).toBe(false);
  });
  test('may be left out where it may', () => {
    expect(optionalLevel('Chain loss', 'dB').parse('')).toBeUndefined();
    expect(optionalLevel('Chain loss', 'dB').parse('1,5 dB')).toBe(1.5);
  });
});

test('a number out of its range names the range', () => {
  const answer = optionalNumber('Guard factor', 0, 3).safeParse('4');
  expect(answer.success).toBe(false);
  expect(JSON.stringify(answer.error?.issues)).toContain('Guard factor must be a number from 0 to 3. Found “4”.');
});
