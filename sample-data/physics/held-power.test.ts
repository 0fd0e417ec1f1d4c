import { describe, expect, it } from 'vitest';
import { averagedPower, heldPower } from './held-power.js';
import { randomSource } from './random-source.js';
import { maxHoldExcessDb } from '../truth/max-hold-excess.js';

const decibels = (ratio: number): number => 10 * Math.log10(ratio);
const quantile = (values: readonly number[], share: number): number => [...values].sort((one, other) => one - other)[Math.floor(share * values.length)] ?? NaN;
const noise = { signalMw: 0, noiseMw: 1 };

function many(count: number, draw: () => number): number[] {
  return Array.from({ length: count }, draw);
}

describe('noise through an RBW', () => {
  it('has the mean power that it was given', () => {
    const random = randomSource(11);
    const powers = many(200_000, () => heldPower(noise, 1, random));
    expect(Math.abs(powers.reduce((sum, power) => sum + power, 0) / powers.length - 1)).toBeLessThan(0.01);
  });

  it.each([[1, 100_000], [3, 60_000], [10, 40_000], [100, 8_000]])('held over %i looks follows −ln(1 − q^(1/n))', (looks, count) => {
    const random = randomSource(12 + looks);
    const powers = many(count, () => heldPower(noise, looks, random));
    for (const share of [0.05, 0.5, 0.95]) {
      const expectedDb = decibels(-Math.log(1 - share ** (1 / looks)));
      expect(Math.abs(decibels(quantile(powers, share)) - expectedDb)).toBeLessThan(looks === 1 && share === 0.05 ? 0.35 : 0.15);
    }
  });

  it('averages to its mean with a spread of 1/√K', () => {
    const random = randomSource(13);
    const powers = many(5_000, () => averagedPower(noise, 25, random));
    const spread = Math.sqrt(powers.reduce((sum, power) => sum + (power - 1) ** 2, 0) / powers.length);
    expect(Math.abs(spread - 0.2)).toBeLessThan(0.01);
  });
});

describe('a carrier in noise', () => {
  it('reads its power plus that of the noise on average', () => {
    const random = randomSource(14);
    const power = averagedPower({ signalMw: 1, noiseMw: 1 }, 200_000, random);
    expect(Math.abs(decibels(power) - 3.0103)).toBeLessThan(0.05);
  });

  // Medians over the true carrier from outside the project: non-central χ² with two degrees of freedom.
  it.each([[0, 1, 1.894], [0, 10, 6.962], [6, 10, 3.98], [10, 100, 3.92], [20, 10, 0.894], [20, 100, 1.411], [30, 10, 0.288]])(
    'at %i dB over the noise, held over %i looks, reads %f dB high in the median', (overNoiseDb, looks, expectedDb) => {
      const random = randomSource(15);
      const signalMw = 10 ** (overNoiseDb / 10);
      const powers = many(looks > 10 ? 6_000 : 30_000, () => heldPower({ signalMw, noiseMw: 1 }, looks, random));
      expect(Math.abs(decibels(quantile(powers, 0.5) / signalMw) - expectedDb)).toBeLessThan(0.05);
      expect(maxHoldExcessDb(overNoiseDb, looks)).toBeCloseTo(expectedDb, 6);
    });

  it('has no excess worth naming where noise is far below', () => {
    expect(maxHoldExcessDb(60, 100)).toBeCloseTo(0.467, 6);
    expect(maxHoldExcessDb(15, 10)).toBeCloseTo((2.649 + 0.894) / 2, 6);
  });
});
