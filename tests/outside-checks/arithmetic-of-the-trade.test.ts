import { censoredQuantile } from '@leeside/attenuation/censored-quantile';
import { curveFromSweeps } from '@leeside/attenuation/curve-from-sweeps';
import type { TypedLevel } from '@leeside/attenuation/curve-input';
import { attenuationOf } from '@leeside/attenuation/reading-points';
import { theilSenSlope } from '@leeside/attenuation/theil-sen';
import { describe, expect, test } from 'vitest';

const parameters = { floorMarginDb: 6, driftLimitDb: 3, standsForRatio: 1.1 };
const typed = (referenceDbm: number, enclosedDbm: number, inTheNoise: boolean): TypedLevel[] => (['reference', 'enclosed'] as const).map((role, order) => ({
  id: role, role, sampleId: null, condition: '', frequencyHz: 915e6, levelDbm: role === 'reference' ? referenceDbm : enclosedDbm, inTheNoise: inTheNoise && role === 'enclosed', order,
}));

describe('levels read off the screen (common practice, no source)', () => {
  test.each([[-31, -95, true, 64], [-24, -76, false, 52], [-24, -58, false, 34]])('%d dBm against %d dBm, in the noise: %s', (referenceDbm, enclosedDbm, inTheNoise, attenuationDb) => {
    const curve = curveFromSweeps({ enclosed: [], references: [], noises: [], leakages: [], ambients: [], levels: typed(referenceDbm, enclosedDbm, inTheNoise), parameters, requirement: null });
    expect(curve.kind).toBe('curve');
    if (curve.kind === 'curve') expect([curve.points.attenuationDb[0], curve.points.atLeast[0] === 1]).toEqual([attenuationDb, inTheNoise]);
  });
});

describe('definitions (computed)', () => {
  const floor = (medianLevel: number, marginDb: number) => ({ medianLevel, noisePowerLevel: medianLevel, thresholdLevel: medianLevel + marginDb, looks: 100 });
  test('−12.3 dBm in the open, −78.9 dBm enclosed: 66.6 dB', () => {
    const result = attenuationOf({ referenceLevel: -12.3, enclosedLevel: -78.9, floor: null, leakageLevel: null, correctionDb: 0, settings: {} });
    expect(result.attenuationDb).toBeCloseTo(66.6, 10);
  });
  test.each([[6, 75], [10, 71]])('−20 dBm over a floor of −101 dBm with a margin of %d dB shows at least %d dB', (marginDb, boundDb) => {
    const result = attenuationOf({ referenceLevel: -20, enclosedLevel: -100, floor: floor(-101, marginDb), leakageLevel: null, correctionDb: 0, settings: {} });
    expect(result).toMatchObject({ attenuationDb: boundDb, atLeast: true, ceilingDb: boundDb });
  });
  test('−97 dBm over −101 dBm of noise, power averaged: 79.205 dB once the noise is taken out', () => {
    const result = attenuationOf({ referenceLevel: -20, enclosedLevel: -97, floor: floor(-101, 3), leakageLevel: null, correctionDb: 0, settings: { detector: 'rms' } });
    expect(result.attenuationDb).toBeCloseTo(79.205, 3);
    expect(result.noiseTakenOut).toBe(true);
  });
  test.each([[1, -6.8683], [3, -3.0206], [6, -1.2563], [10, -0.4576]])('%d dB over the noise are %f dB too many (closed form)', (overDb, correctionDb) => {
    const result = attenuationOf({ referenceLevel: 0, enclosedLevel: -100 + overDb, floor: floor(-100, 0), leakageLevel: null, correctionDb: 0, settings: { detector: 'rms' } });
    expect(result.attenuationDb).toBeCloseTo(100 - overDb - correctionDb, 3);
  });
  test('a reading 6 dB above the leakage is a bound, 20 dB above it exact', () => {
    const reading = (leakageLevel: number) => attenuationOf({ referenceLevel: 0, enclosedLevel: -60, floor: null, leakageLevel, correctionDb: 0, settings: {} });
    expect(reading(-66)).toMatchObject({ atLeast: true });
    expect(reading(-66).attenuationDb).toBeCloseTo(60 - 3.529, 2);
    expect(reading(-80)).toMatchObject({ atLeast: false, attenuationDb: 60 });
  });
});

describe('bounds among values (computed with R 4.2.2, survival 3.5)', () => {
  const exact = [62.1, 58.4, 71.0, 66.3, 69.2, 77.5, 64.8, 73.1].map((value) => ({ value, atLeast: false }));
  const bounds = [75, 80, 80, 80].map((value) => ({ value, atLeast: true }));
  test.each([[0.5, 72.05], [0.1, 62.1], [0.2, 64.8], [0.25, 65.55]])('quantile %f is %f', (quantile, value) => {
    expect(censoredQuantile([...exact, ...bounds], quantile)?.value).toBeCloseTo(value, 10);
  });
  test('a quantile that is not reached is at least the largest value', () => {
    expect(censoredQuantile([{ value: 40, atLeast: false }, ...bounds], 0.5)).toEqual({ value: 80, atLeast: true });
  });
});

test('slope of Theil and Sen of eight points with a stray one: 1.035 (computed with R 4.2.2)', () => {
  expect(theilSenSlope([1, 2, 3, 4, 5, 6, 7, 8], [1.0, 2.1, 2.9, 4.2, 5.0, 6.1, 6.9, 30])).toBeCloseTo(1.035, 10);
});
