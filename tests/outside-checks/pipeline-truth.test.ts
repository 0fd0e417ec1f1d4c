import { describe, expect, it } from 'vitest';
import { judgeCurve } from '../../sample-data/truth/judge-curve.js';
import { makeTruthSet } from '../../sample-data/truth/make-truth-set.js';
import { failedGateLines } from '../truth/gate-lines.js';
import { truthVariants, variantName } from '../truth/truth-variants.js';
import { curveOfTruthFiles } from './curve-of-truth-files.js';

describe('from bytes to a curve, judged by what is true', () => {
  it.each(truthVariants.map((variant) => [variantName(variant), variant] as const))('%s', (_name, variant) => {
    const { files, truth } = makeTruthSet(variant);
    const curve = curveOfTruthFiles(files);
    expect(curve.style).toBe(variant.style);
    expect(curve.floorSource).toBe(variant.noiseSweep ? 'noise sweep' : variant.style === 'continuous' ? 'none' : 'beside the carriers');
    expect(curve.driftDb).toBeCloseTo(0.6, 1);
    expect(failedGateLines(judgeCurve(curve.points, truth))).toEqual([]);
  });
});
