import { makeSweep, type SweepSettings } from '@leeside/trace-reading/sweep';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { curveFromSweeps } from './curve-from-sweeps.js';
import type { CurveInput, MeasuredSweep, Role, TypedLevel } from './curve-input.js';
import type { CurveResult } from './curve-result.js';

const parameters = { floorMarginDb: 6, driftLimitDb: 3, standsForRatio: 1.1 };
const axis = Float64Array.from({ length: 201 }, (_, at) => 100e6 + at * 5e6);

function measured(role: Role, level: Float32Array, more: Partial<MeasuredSweep> & { settings?: SweepSettings } = {}): MeasuredSweep {
  const made = makeSweep({ frequencyHz: axis, level, levelUnit: 'dBm', settings: more.settings ?? {} });
  if (made.kind === 'fault') throw new Error(made.fault.reason);
  return {
    traceId: more.traceId ?? role, role, sweep: made.sweep, sampleId: null, condition: '', polarisation: '', position: '', measuredAtMs: null, uploadOrder: role === 'reference' ? 0 : 1,
    chainLossDb: more.chainLossDb ?? null, transmitLevelDbm: more.transmitLevelDbm ?? null, pairedWith: null, ...(more.uploadOrder === undefined ? {} : { uploadOrder: more.uploadOrder }),
  };
}

function curveOf(parts: Partial<CurveInput>): CurveResult {
  const curve = curveFromSweeps({ enclosed: [], references: [], noises: [], leakages: [], ambients: [], levels: [], parameters, requirement: null, ...parts });
  if (curve.kind !== 'curve') throw new Error(curve.reason);
  return curve;
}

/** Smooth levels: signal in every bin. */
const smooth = fc.tuple(fc.double({ min: -60, max: 0, noNaN: true }), fc.double({ min: 0, max: 12, noNaN: true }), fc.double({ min: 1, max: 9, noNaN: true }))
  .map(([base, swing, turns]) => Float32Array.from(axis, (_, at) => base + swing * Math.sin((turns * at) / axis.length)));
const shifted = (level: Float32Array, byDb: number): Float32Array => level.map((value) => value + byDb);
const noiseAt = (levelDbm: number, seed: number): Float32Array => Float32Array.from(axis, (_, at) => levelDbm + 1.2 * Math.sin(at * 12.9898 + seed) * Math.cos(at * 78.233));

describe('laws of the curve', () => {
  test('a sweep against itself is zero', () => fc.assert(fc.property(smooth, (level) => {
    const { points } = curveOf({ references: [measured('reference', level)], enclosed: [measured('enclosed', level)] });
    expect([...points.attenuationDb]).toEqual(Array.from(axis, () => 0));
  })));

  test('swapping reference and enclosed turns the sign', () => fc.assert(fc.property(smooth, smooth, (one, other) => {
    const there = curveOf({ references: [measured('reference', one)], enclosed: [measured('enclosed', other)] }).points.attenuationDb;
    const back = curveOf({ references: [measured('reference', other)], enclosed: [measured('enclosed', one)] }).points.attenuationDb;
    there.forEach((value, at) => expect(value).toBeCloseTo(-(back[at] ?? NaN), 4));
  })));

  test('a reference 3 dB higher is a curve 3 dB higher, and so is 3 dB of chain loss', () => fc.assert(fc.property(smooth, smooth, (reference, enclosed) => {
    const plain = curveOf({ references: [measured('reference', reference)], enclosed: [measured('enclosed', enclosed)] }).points.attenuationDb;
    const higher = curveOf({ references: [measured('reference', shifted(reference, 3))], enclosed: [measured('enclosed', enclosed)] }).points.attenuationDb;
    const lossy = curveOf({ references: [measured('reference', reference, { chainLossDb: 3 })], enclosed: [measured('enclosed', enclosed)] }).points.attenuationDb;
    plain.forEach((value, at) => {
      expect(higher[at]).toBeCloseTo(value + 3, 4);
      expect(lossy[at]).toBeCloseTo(value + 3, 4);
    });
  })));

  test('raising the generator by 20 dB for the enclosed sweep adds 20 dB', () => {
    const [reference, enclosed] = [new Float32Array(axis.length).fill(-10), new Float32Array(axis.length).fill(-40)];
    const { points } = curveOf({ references: [measured('reference', reference, { transmitLevelDbm: 0 })], enclosed: [measured('enclosed', enclosed, { transmitLevelDbm: 20 })] });
    expect(points.attenuationDb[0]).toBe(50);
  });

  test('more noise never makes a bound exact, and never lifts a bound', () => fc.assert(fc.property(fc.double({ min: -110, max: -70, noNaN: true }), fc.double({ min: 0.5, max: 20, noNaN: true }), (floorDbm, moreDb) => {
    const reference = measured('reference', new Float32Array(axis.length).fill(-10));
    const enclosed = measured('enclosed', Float32Array.from(axis, (_, at) => -60 - 0.2 * at));
    const quiet = curveOf({ references: [reference], enclosed: [enclosed], noises: [measured('noise', noiseAt(floorDbm, 1))] }).points;
    const loud = curveOf({ references: [reference], enclosed: [enclosed], noises: [measured('noise', noiseAt(floorDbm + moreDb, 1))] }).points;
    const loudAt = new Map(Array.from(loud.frequencyHz, (frequency, at) => [frequency, at]));
    quiet.frequencyHz.forEach((frequency, at) => {
      const place = loudAt.get(frequency);
      if (place === undefined || quiet.atLeast[at] !== 1) return;
      expect(loud.atLeast[place]).toBe(1);
      expect(loud.attenuationDb[place]).toBeLessThanOrEqual((quiet.attenuationDb[at] ?? NaN) + 1e-4);
    });
  })));

  test('the same input gives the same bytes', () => fc.assert(fc.property(smooth, smooth, (reference, enclosed) => {
    const parts = { references: [measured('reference', reference)], enclosed: [measured('enclosed', enclosed)], noises: [measured('noise', noiseAt(-95, 2))] };
    expect(curveOf(parts)).toEqual(curveOf(parts));
  })));
});

describe('repeats', () => {
  const reference = measured('reference', new Float32Array(axis.length).fill(-10));
  const noise = measured('noise', noiseAt(-90, 3));
  const repeat = (traceId: string, levelDbm: number, uploadOrder: number): MeasuredSweep => measured('enclosed', new Float32Array(axis.length).fill(levelDbm), { traceId, uploadOrder });

  test('the worst counts at each frequency; mean and spread stand beside it', () => {
    const { points, pairs } = curveOf({ references: [reference], enclosed: [repeat('a', -60, 1), repeat('b', -55, 2)], noises: [noise] });
    expect([points.attenuationDb[7], points.meanDb[7], points.spreadDb[7], pairs[points.worstOf[7] ?? 9]?.enclosed]).toEqual([45, 47.5, 5, 'b']);
  });

  test('a bound below an exact value keeps both: at least the first, at most the second', () => {
    const behindPad = measured('enclosed', new Float32Array(axis.length).fill(-89), { traceId: 'a', uploadOrder: 1, chainLossDb: 10 });
    const { points } = curveOf({ references: [reference], enclosed: [behindPad, repeat('b', -80, 2), repeat('c', -78, 3)], noises: [noise] });
    expect(points.atLeast[7]).toBe(1);
    expect(points.attenuationDb[7]).toBeLessThan(66);
    expect(points.atMostDb[7]).toBe(68);
    expect(points.meanDb[7]).toBeNaN();
  });
});

describe('typed levels', () => {
  const level = (role: Role, levelDbm: number, order: number, inTheNoise = false): TypedLevel => ({ id: String(order), role, sampleId: null, condition: '', frequencyHz: 433.92e6, levelDbm, inTheNoise, order });

  test('in the noise bounds with the level typed', () => {
    const { points, lowest, style } = curveOf({ levels: [level('reference', -31, 1), level('enclosed', -95, 2, true)] });
    expect([points.attenuationDb[0], points.atLeast[0], points.ceilingDb[0], style]).toEqual([64, 1, 64, 'spot']);
    expect(lowest).toEqual({ frequencyHz: 433.92e6, attenuationDb: 64, atLeast: true, atMostDb: null });
  });

  test('a typed noise level is the floor there', () => {
    expect([...curveOf({ levels: [level('reference', -24, 1), level('noise', -80, 2), level('enclosed', -76, 3)] }).points.atLeast]).toEqual([1]);
    expect([...curveOf({ levels: [level('reference', -24, 1), level('noise', -100, 2), level('enclosed', -76, 3)] }).points.attenuationDb]).toEqual([52]);
  });
});
