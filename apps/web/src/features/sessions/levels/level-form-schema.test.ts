import { expect, test } from 'vitest';
import { emptyLevel, levelBody, levelFormSchema } from './level-form-schema';

const typed = { ...emptyLevel, role: 'enclosed' as const, sampleId: 'a', condition: ' one roll ', frequency: '2,4 GHz', level: '-98 dBm', inTheNoise: true };

test('a typed level becomes hertz and dBm', () => {
  expect(levelBody(levelFormSchema.parse(typed))).toEqual({ role: 'enclosed', frequencyHz: 2.4e9, levelDbm: -98, sampleId: 'a', condition: 'one roll', inTheNoise: true });
});
test('a reference has no sample and is never in the noise', () => {
  expect(levelBody(levelFormSchema.parse({ ...typed, role: 'reference' }))).toEqual({ role: 'reference', frequencyHz: 2.4e9, levelDbm: -98 });
});
test('each missing number is named', () => {
  const answer = levelFormSchema.safeParse(emptyLevel);
  expect(answer.error?.issues.map(({ message }) => message)).toEqual(['Frequency is missing. Write for example 433.92 MHz.', 'Level is missing. Write for example −31 dBm.']);
});
