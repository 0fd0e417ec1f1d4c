import { decibelsFromPowerRatio, powerRatioFromDecibels } from '@leeside/units/decibels';
import { averagedPower, heldPower } from './held-power.js';
import type { RandomSource } from './random-source.js';

/** What arrives at the analyzer, and how it looks at it. */
export interface SweepPhysics {
  /** Signal at each point without noise, dBm; −Infinity for none. */
  readonly signalDbm: Float64Array;
  /** Mean noise power in the RBW at each point, dBm. */
  readonly noiseDbm: Float64Array;
  /** Independent looks that are held or averaged at each point, ≥ 1. */
  readonly looks: number;
  readonly combined: 'held' | 'averaged';
  /** Steps in which the analyzer writes levels, dB. */
  readonly quantumDb: number;
}

/**
 * One sweep as the analyzer would write it.
 * @returns dBm at each point, in steps of `quantumDb`.
 */
export function simulateSweep(physics: SweepPhysics, random: RandomSource): Float64Array {
  const combine = physics.combined === 'held' ? heldPower : averagedPower;
  return physics.signalDbm.map((signalDbm, point) => {
    const powers = {
      signalMw: powerRatioFromDecibels(signalDbm),
      noiseMw: powerRatioFromDecibels(physics.noiseDbm[point] ?? -Infinity),
    };
    const levelDbm = decibelsFromPowerRatio(combine(powers, physics.looks, random));
    return Math.round(levelDbm / physics.quantumDb) * physics.quantumDb;
  });
}
