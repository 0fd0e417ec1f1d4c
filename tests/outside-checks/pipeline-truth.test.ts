import { describe, expect, it } from 'vitest';
import { judgeCurve } from '../../sample-data/truth/judge-curve.js';
import { makeTruthSet } from '../../sample-data/truth/make-truth-set.js';
import { failedGateLines } from '../truth/gate-lines.js';
import { truthVariants, unsolvedVariants, variantName } from '../truth/truth-variants.js';
import { curveOfTruthFiles } from './curve-of-truth-files.js';

describe('from bytes to a curve, judged by what is true', () => {
  it.each(truthVariants.map((variant) => [variantName(variant), variant] as const))('%s', (_name, variant) => {
    const { files, truth } = makeTruthSet(variant);
    const curve = curveOfTruthFiles(files);
    expect(curve.style).toBe(variant.style);
    expect(curve.floorSource).toBe(variant.noiseSweep ? 'noise sweep' : variant.style === 'continuous' ? 'none' : 'beside the carriers');
    // The references are 0.6 dB apart; each level is rounded to a step, and the drift is the largest over all carriers.
    expect(Math.abs((curve.driftDb ?? 0) - 0.6)).toBeLessThanOrEqual(0.05 + variant.quantumDb);
    expect(failedGateLines(judgeCurve(curve.points, truth))).toEqual([]);
  });
});

describe('known to go wrong today', () => {
  const named = unsolvedVariants.map((variant) => [variantName(variant), variant] as const);
  it.fails.each(named)('misses a gate: %s', (_name, variant) => {
    const { files, truth } = makeTruthSet(variant);
    expect(failedGateLines(judgeCurve(curveOfTruthFiles(files).points, truth))).toEqual([]);
  });
  it.each(named)('is of the right style all the same: %s', (_name, variant) => {
    expect(curveOfTruthFiles(makeTruthSet(variant).files).style).toBe(variant.style);
  });
});
