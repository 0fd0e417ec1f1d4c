import { describe, expect, it } from 'vitest';
import { gateHolds, judgeCurve, pooledGates, type CurveToJudge } from './judge-curve.js';
import { makeTruthSet } from './make-truth-set.js';

const { truth } = makeTruthSet({
  seed: 9, style: 'continuous', points: 1001, referencePoints: 1001, combSpacingBins: 20, spotSpanInRbw: 200, quantumDb: 0.01, looks: { reference: 10, enclosed: 10, noise: 10 }, combined: 'held',
  noiseSweep: true, rbwHz: 10_000, layout: 'plain', settingsWritten: true,
});

/** The curve of a program that knows the truth: exact from 9 dB over the noise on, below at least what 9 dB over the noise would give. */
const honest: CurveToJudge & { attenuationDb: number[]; atLeast: boolean[] } = {
  frequencyHz: truth.frequencyHz,
  atLeast: Array.from(truth.enclosedSignalDbm, (levelDbm, at) => levelDbm - (truth.meanNoiseDbm[at] ?? 0) < 9),
  attenuationDb: Array.from(truth.trueAttenuationDb, (attenuationDb, at) =>
    Math.min(attenuationDb, (truth.referenceLevelDbm[at] ?? 0) - (truth.meanNoiseDbm[at] ?? 0) - 9)),
};
const verdicts = (curve: CurveToJudge): boolean[] => judgeCurve(curve, truth).map(gateHolds);
const changed = (change: (attenuationDb: number, isBound: boolean) => number): CurveToJudge => ({
  ...honest, attenuationDb: honest.attenuationDb.map((attenuationDb, at) => change(attenuationDb, honest.atLeast[at] ?? false)),
});

describe('judgeCurve', () => {
  it('passes an honest curve, and every gate concerns many points', () => {
    const gates = judgeCurve(honest, truth);
    expect(gates.map(gateHolds)).toEqual([true, true, true, true, true, true]);
    for (const gate of gates) expect(gate.of).toBeGreaterThan(100);
  });

  it('misses what does not appear', () => {
    const keep = (_: unknown, at: number): boolean => at % 10 !== 0;
    const thinned = { frequencyHz: Array.from(honest.frequencyHz).filter(keep), attenuationDb: honest.attenuationDb.filter(keep), atLeast: honest.atLeast.filter(keep) };
    expect(verdicts(thinned)).toEqual([false, true, true, true, true, true]);
  });

  it('catches exact values that are off, or not numbers', () => {
    expect(verdicts(changed((attenuationDb, isBound) => attenuationDb + (isBound ? 0 : 2)))[1]).toBe(false);
    expect(verdicts(changed((attenuationDb, isBound) => attenuationDb - (isBound ? 0 : 6))).slice(1, 3)).toEqual([false, false]);
    expect(verdicts(changed(() => NaN)).slice(1, 5)).toEqual([false, false, false, false]);
  });

  it('catches bounds that promise too much or too little', () => {
    const boundShift = (shiftDb: number): boolean[] => verdicts(changed((attenuationDb, isBound) => attenuationDb + (isBound ? shiftDb : 0)));
    expect(boundShift(20)).toEqual([true, true, true, false, true, true]);
    expect(boundShift(-8)).toEqual([true, true, true, true, false, true]);
  });

  it('catches noise passed off as a value, and values passed off as bounds', () => {
    expect(verdicts({ ...honest, atLeast: honest.atLeast.map(() => false) })[5]).toBe(false);
    expect(verdicts({ ...honest, atLeast: honest.atLeast.map(() => true) }).slice(1, 3)).toEqual([false, false]);
  });

  it('adds the counts of several curves', () => {
    const once = judgeCurve(honest, truth);
    expect(pooledGates([once, once])[0]).toMatchObject({ of: (once[0]?.of ?? 0) * 2, passed: (once[0]?.passed ?? 0) * 2 });
  });
});
