import { describe, expect, it } from 'vitest';
import { randomSource } from './random-source.js';

const draws = 200_000;
const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length;

describe('randomSource', () => {
  it('gives the same numbers for the same seed and others for its neighbour', () => {
    const take = (seed: number): number[] => {
      const random = randomSource(seed);
      return Array.from({ length: 20 }, () => random.gaussian());
    };
    expect(take(5)).toEqual(take(5));
    expect(take(5)).not.toEqual(take(6));
  });

  it('spreads evenly over 0 to 1', () => {
    const random = randomSource(1);
    const values = Array.from({ length: draws }, () => random.uniform());
    expect(Math.min(...values.slice(0, 1000))).toBeGreaterThanOrEqual(0);
    expect(mean(values)).toBeCloseTo(0.5, 2);
    expect(mean(values.map((value) => (value - 0.5) ** 2))).toBeCloseTo(1 / 12, 3);
  });

  it('gives normal numbers: variance 1, fourth moment 3, neighbours unrelated', () => {
    const random = randomSource(2);
    const values = Array.from({ length: draws }, () => random.gaussian());
    expect(Math.abs(mean(values))).toBeLessThan(0.01);
    expect(Math.abs(mean(values.map((value) => value ** 2)) - 1)).toBeLessThan(0.015);
    expect(Math.abs(mean(values.map((value) => value ** 4)) - 3)).toBeLessThan(0.12);
    expect(Math.abs(mean(values.slice(1).map((value, at) => value * (values[at] ?? 0))))).toBeLessThan(0.01);
  });
});
