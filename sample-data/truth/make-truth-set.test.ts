import { describe, expect, it } from 'vitest';
import { makeTruthSet } from './make-truth-set.js';
import type { Truth, TruthFile, TruthOptions } from './truth-set.js';

const options: TruthOptions = {
  seed: 1, style: 'continuous', points: 1001, referencePoints: 1001, combSpacingBins: 20, spotSpanInRbw: 200, quantumDb: 0.01, looks: { reference: 10, enclosed: 10, noise: 10 }, combined: 'held',
  noiseSweep: true, rbwHz: 10_000, layout: 'plain', settingsWritten: true,
};

const overNoise = (truth: Truth): number[] => Array.from(truth.enclosedSignalDbm, (levelDbm, at) => levelDbm - (truth.meanNoiseDbm[at] ?? 0));
const shareOf = (values: number[], from: number, to: number): number => values.filter((value) => value >= from && value < to).length / values.length;
const levelsOf = (file: TruthFile | undefined): number[] =>
  Buffer.from(file?.bytes ?? []).toString('utf8').split('\n').filter((line) => /^\d/.test(line)).map((line) => Number(line.split(',')[1]));

describe('makeTruthSet', () => {
  it('gives the same bytes for the same options and others for another seed', () => {
    expect(makeTruthSet(options)).toEqual(makeTruthSet(options));
    expect(makeTruthSet({ ...options, seed: 2 }).files[0]?.bytes).not.toEqual(makeTruthSet(options).files[0]?.bytes);
  });

  it.each(['continuous', 'comb', 'spot'] as const)('%s: the inside signal stands at every height over and under the noise', (style) => {
    const { truth } = makeTruthSet({ ...options, style });
    for (const [from, to] of [[-60, -3], [-3, 12], [12, 25], [25, 90]] as const) expect(shareOf(overNoise(truth), from, to)).toBeGreaterThan(0.1);
    for (const attenuationDb of truth.trueAttenuationDb) expect(attenuationDb).toBeGreaterThanOrEqual(0);
  });

  it('puts two references 0.6 dB apart around the enclosed sweep, in time too', () => {
    const { files, truth } = makeTruthSet({ ...options, looks: { reference: 1, enclosed: 1, noise: 1 } });
    const [opening, noise, enclosed, closing] = files;
    expect(files.map((file) => file.role)).toEqual(['reference', 'noise', 'enclosed', 'reference']);
    expect([opening, noise, enclosed, closing].map((file) => file?.measuredAt).toSorted()).toEqual(files.map((file) => file.measuredAt));
    const first = levelsOf(opening);
    const last = levelsOf(closing);
    expect(first).toHaveLength(1001);
    expect((last[100] ?? 0) - (first[100] ?? 0)).toBeCloseTo(0.6, 1);
    expect(((last[100] ?? 0) + (first[100] ?? 0)) / 2).toBeCloseTo(truth.referenceLevelDbm[100] ?? 0, 1);
  });

  it('shows noise alone at its mean power in the RBW', () => {
    const { files, truth } = makeTruthSet({ ...options, points: 4001, referencePoints: 4001, looks: { reference: 1, enclosed: 1, noise: 1 } });
    const ratios = levelsOf(files.find((file) => file.role === 'noise')).map((levelDbm, bin) => 10 ** ((levelDbm - (truth.meanNoiseDbm[bin] ?? 0)) / 10));
    expect(ratios).toHaveLength(4001);
    expect(Math.abs(ratios.reduce((sum, ratio) => sum + ratio, 0) / ratios.length - 1)).toBeLessThan(0.05);
  });

  it('shows each comb carrier at its level within two points of its frequency', () => {
    const { files, truth } = makeTruthSet({ ...options, style: 'comb', points: 2001, referencePoints: 2001 });
    const levels = levelsOf(files[0]);
    const stepHz = (6e9 - 3e7) / 2000;
    truth.frequencyHz.forEach((carrierHz, carrier) => {
      const nearest = Math.round((carrierHz - 3e7) / stepHz);
      const highest = Math.max(...levels.slice(nearest - 2, nearest + 3));
      expect(Math.abs(highest - ((truth.referenceLevelDbm[carrier] ?? 0) - 0.3))).toBeLessThan(0.2);
    });
    expect(truth.frequencyHz).toHaveLength(100);
  });

  it('makes four files for each spot, three without a noise sweep', () => {
    expect(makeTruthSet({ ...options, style: 'spot', points: 600, referencePoints: 600 }).files).toHaveLength(96);
    expect(makeTruthSet({ ...options, style: 'spot', points: 600, referencePoints: 600, noiseSweep: false }).files).toHaveLength(72);
  });
});
