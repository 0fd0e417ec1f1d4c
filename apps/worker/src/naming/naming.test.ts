import { describe, expect, test } from 'vitest';
import { guessRole } from './guess-role.js';
import { guessSample } from './guess-sample.js';

describe('words in a file name', () => {
  test.each([
    ['reference-opening.csv', 'reference'], ['2026-03-02_REF_open air.csv', 'reference'], ['noise-generator-off.csv', 'noise'], ['NoiseFloor 3.txt', 'noise'],
    ['enclosed-MP24-011.csv', 'enclosed'], ['MP24-011 inside.csv', 'enclosed'], ['Leakage.csv', 'leakage'], ['ambient_sweep.csv', 'ambient'],
    ['Referenz.csv', 'reference'], ['Rauschen.csv', 'noise'], ['fermé_2.csv', 'enclosed'],
    ['trace001.csv', null], ['preference.csv', null], ['closet.csv', null],
  ])('%s is %s', (name, role) => expect(guessRole(name)).toBe(role));
});

describe('sample codes in a file name', () => {
  const samples = [{ id: 'a', code: 'MP24-01' }, { id: 'b', code: 'MP24-011' }, { id: 'c', code: 'K7' }];
  test.each([
    ['enclosed_MP24-011_folded.csv', 'b'], ['enclosed mp24 01.csv', 'a'], ['inside-K7.csv', 'c'], ['inside-K77.csv', null], ['MP24.csv', null],
  ])('%s belongs to %s', (name, id) => expect(guessSample(name, samples)).toBe(id));
});
