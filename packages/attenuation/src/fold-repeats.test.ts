import { expect, test } from 'vitest';
import { foldRepeats } from './fold-repeats.js';
import type { PairReading, PairRow } from './read-pair.js';

/** A band that was read every megahertz. */
function band(fromMhz: number, toMhz: number, ceilingDb: number): PairReading {
  const rows = Array.from({ length: toMhz - fromMhz + 1 }, (_, at): PairRow => ({
    frequencyHz: (fromMhz + at) * 1e6, attenuationDb: 40, atLeast: false, ceilingDb, excessDb: 0, referenceLevel: 0, enclosedLevel: -40, floorLevel: -90,
  }));
  return { pair: { enclosed: `${fromMhz}`, reference: 'r', closing: null, noise: null }, style: 'continuous', floorSource: 'noise sweep', rows, gaps: [], stepHz: 1e6, driftDb: null, doubts: [] };
}
const frequenciesOf = (bands: readonly PairReading[]): number[] => foldRepeats(bands).rows.map((row) => row.frequencyHz / 1e6);
const whole = (fromMhz: number, toMhz: number): number[] => Array.from({ length: toMhz - fromMhz + 1 }, (_, at) => fromMhz + at);

test('a band measured last between two others is kept whole', () => {
  const bands = [band(30, 100, 60), band(500, 1000, 60), band(200, 400, 60)];
  expect(frequenciesOf(bands)).toEqual([...whole(30, 100), ...whole(200, 400), ...whole(500, 1000)]);
  expect(foldRepeats(bands).doubts).toEqual([]);
});

test('where bands overlap the one with the higher ceiling is read, and the seam is said', () => {
  const bands = [band(30, 100, 60), band(80, 400, 70), band(390, 900, 50)];
  const { rows, doubts } = foldRepeats(bands);
  expect(rows.map((row) => row.frequencyHz / 1e6)).toEqual(whole(30, 900));
  expect(rows.find((row) => row.frequencyHz === 90e6)?.ceilingDb).toBe(70);
  expect(rows.find((row) => row.frequencyHz === 395e6)?.ceilingDb).toBe(70);
  expect(doubts.map(({ message }) => /at (\d+) Hz/.exec(message)?.[1])).toEqual(['80000000', '400000000']);
});
