import { allowanceAtThresholdDb, excessDb, largestOfNoiseDb, looksFromSpread } from '@leeside/attenuation/noise-statistics';
import { averagesPower } from '@leeside/attenuation/reading-points';
import { decibelsFromPowerRatio, powerRatioFromDecibels } from '@leeside/units/decibels';
import { dbmOverDbv, levelDbmFrom, levelDbuvFrom, voltsFromDbm } from '@leeside/units/level-unit';
import { describe, expect, test } from 'vitest';
import { seededRandom } from '../faults/seeded-random.js';

const random = seededRandom(33);
const gauss = (): number => Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());

/** Level of a carrier in complex Gaussian noise of mean power 1, the largest of n looks, in dB. */
function heldLevelDb(signalToNoiseDb: number, looks: number): number {
  const amplitude = Math.sqrt(powerRatioFromDecibels(signalToNoiseDb));
  let largest = 0;
  for (let look = 0; look < looks; look += 1) {
    const power = (amplitude + gauss() * Math.SQRT1_2) ** 2 + (gauss() * Math.SQRT1_2) ** 2;
    if (power > largest) largest = power;
  }
  return decibelsFromPowerRatio(largest);
}
const quantileOf = (values: number[], quantile: number): number => values.sort((one, other) => one - other)[Math.floor(quantile * values.length)] ?? NaN;

describe('levels across an impedance (computed from P = U²/R)', () => {
  test.each([[50, 106.9897], [75, 108.7506], [600, 117.7815]])('dBµV over dBm at %d Ω', (impedanceOhm, apartDb) => {
    expect(levelDbuvFrom(0, impedanceOhm)).toBeCloseTo(apartDb, 4);
    expect(levelDbmFrom(0, 'dBµV', impedanceOhm)).toBeCloseTo(-apartDb, 4);
    expect(dbmOverDbv(impedanceOhm)).toBeCloseTo(120 - apartDb, 4);
  });
  test('−107 dBm is −0.010 dBµV, 0 dBm is 0.223607 V, 13 dBm is 0.99888 V at 50 Ω', () => {
    expect(levelDbuvFrom(-107, 50)).toBeCloseTo(-0.0103, 4);
    expect(voltsFromDbm(0, 50)).toBeCloseTo(0.223607, 6);
    expect(voltsFromDbm(13, 50)).toBeCloseTo(0.99881, 4);
  });
});

describe('the largest of n noise looks over the mean noise power (closed forms, computed with scipy 1.17)', () => {
  const table: readonly (readonly [number, number, number, number])[] = [
    [1, -1.5917, 4.765, 6.6325], [2, 0.8918, 5.6539, 7.2393], [3, 1.9822, 6.1038, 7.5591], [5, 3.1058, 6.6132, 7.9313], [10, 4.3194, 7.2225, 8.3905], [20, 5.2886, 7.7577, 8.8059], [50, 6.32, 8.3776, 9.3005],
    [100, 6.9681, 8.7942, 9.6404], [1000, 8.6181, 9.9467, 10.61], [10_000, 9.8122, 10.8567, 11.4021],
  ];
  test.each(table)('n = %d', (looks, median, upper, uppermost) => {
    expect(largestOfNoiseDb(0.5, looks)).toBeCloseTo(median, 3);
    expect(largestOfNoiseDb(0.95, looks)).toBeCloseTo(upper, 3);
    expect(largestOfNoiseDb(0.99, looks)).toBeCloseTo(uppermost, 3);
  });

  test.each([1, 10, 100])('a simulation of %d looks agrees, and its looks are found from its scatter', (looks) => {
    const levels = Array.from({ length: 4000 }, () => heldLevelDb(-Infinity, looks));
    expect(Math.abs(quantileOf(levels, 0.5) - largestOfNoiseDb(0.5, looks))).toBeLessThan(0.2);
    const fitted = looksFromSpread(quantileOf(levels, 0.75) - quantileOf(levels, 0.25));
    expect(fitted / looks).toBeGreaterThan(0.6);
    expect(fitted / looks).toBeLessThan(1.7);
  });
});

describe('a held carrier reads high (median of the largest of n non-central χ², computed with scipy 1.17)', () => {
  const table: readonly (readonly [number, number, number])[] = [[0, 1, 1.894], [6, 10, 3.98], [10, 10, 2.649], [10, 100, 3.92], [20, 10, 0.894], [20, 100, 1.411], [30, 100, 0.467]];
  test.each(table)('S/N %d dB, %d looks: %f dB', (signalToNoiseDb, looks, excess) => {
    const levels = Array.from({ length: looks > 10 ? 1500 : 4000 }, () => heldLevelDb(signalToNoiseDb, looks));
    expect(Math.abs(quantileOf(levels, 0.5) - signalToNoiseDb - excess)).toBeLessThan(0.25);
    expect(excessDb(signalToNoiseDb + excess, looks)).toBeCloseTo(excess, 1);
  });

  test.each([[1, 3.5], [2, 1.6], [3, 0.5], [5, 0], [40, 0]])('a signal at the threshold reads below it by more than the allowance of %d looks in 5 %% of cases or fewer', (looks, allowanceDb) => {
    expect(allowanceAtThresholdDb(looks)).toBe(allowanceDb);
    const thresholdDb = Math.max(largestOfNoiseDb(0.5, looks) + 6, largestOfNoiseDb(0.99, looks));
    const below = Array.from({ length: 4000 }, () => heldLevelDb(thresholdDb + allowanceDb, looks)).filter((level) => level < thresholdDb).length / 4000;
    expect(below).toBeLessThan(0.06);
  });
});

test('the floor moves with the bandwidth: 1 to 10 kHz 10 dB, 3 to 10 kHz 5.2288 dB, 9 to 120 kHz 11.2494 dB (computed)', () => {
  expect(decibelsFromPowerRatio(10)).toBe(10);
  expect(decibelsFromPowerRatio(10 / 3)).toBeCloseTo(5.2288, 4);
  expect(decibelsFromPowerRatio(120 / 9)).toBeCloseTo(11.2494, 4);
});

test('noise power may be taken out of power averages alone', () => {
  expect(averagesPower({ detector: 'rms' })).toBe(true);
  for (const settings of [{ detector: 'rms', traceMode: 'max hold' }, { detector: 'peak' }, { detector: 'average' }, { detector: 'average', averaging: 'log' }, {}] as const) expect(averagesPower(settings)).toBe(false);
});
