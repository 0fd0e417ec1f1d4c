import type { Curve } from '@leeside/contracts/curves';
import { expect, test } from 'vitest';
import { curveSummary } from './curve-summary';

const curve = {
  sampleCode: 'P-7', pointCount: 401, lowest: { frequencyHz: 2.4e9, attenuationDb: 57.25, atLeast: true }, outcome: 'meets', requirementName: 'Fifty', gaps: [],
} as unknown as Curve;

test('says what, how low, where and against what', () => {
  expect(curveSummary(curve, 'en')).toBe('Sample P-7, 401 points. The lowest attenuation is at least 57.2\u2009dB at 2.4\u2009GHz. Against “Fifty” it meets it everywhere.');
});
test('says what is missing', () => {
  expect(curveSummary({ ...curve, sampleCode: null, lowest: null, outcome: null, gaps: [{ fromHz: 1, toHz: 2, reason: 'not read' }] }, 'en'))
    .toBe('An enclosed sweep without a sample, 401 points. It has no number. It was compared with no requirement. One stretch has no number.');
});
