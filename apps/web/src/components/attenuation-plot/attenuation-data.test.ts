import type { CurvePointsBody } from '@leeside/contracts/curves';
import { describe, expect, test } from 'vitest';
import { attenuationColumns } from './attenuation-data';

const points = (overrides: Partial<CurvePointsBody> = {}): CurvePointsBody => ({
  frequencyHz: [1e6, 2e6, 4e6, 8e6], attenuationDb: [70, 66, 60, 58], atLeast: [true, false, false, true],
  atMostDb: [null, null, null, null], ceilingDb: [70, 72, 71, null], expandedUncertaintyDb: [null, 2, null, 3],
  requiredDb: [50, 50, 50, 50], ...overrides,
});

describe('the columns of an attenuation plot', () => {
  test('bounds and exact values are columns of their own', () => {
    const columns = attenuationColumns(points(), []);
    expect(columns.exactDb).toEqual([null, 66, 60, null]);
    expect(columns.ownBoundDb).toEqual([70, null, null, 58]);
  });
  test('the dashed line of a bound starts at its exact neighbour', () => {
    expect(attenuationColumns(points(), []).boundDb).toEqual([70, 66, 60, 58]);
  });
  test('no line crosses a gap: a point that holds nothing lies in it', () => {
    const columns = attenuationColumns(points(), [{ fromHz: 2.1e6, toHz: 3.9e6 }]);
    expect(columns.frequencyHz).toHaveLength(5);
    expect(columns.frequencyHz[2]).toBeCloseTo(Math.sqrt(8) * 1e6, 0);
    expect([columns.exactDb[2], columns.boundDb[2], columns.ceilingDb[2]]).toEqual([null, null, null]);
  });
  test('a gap that only touches a point beside it breaks nothing', () => {
    expect(attenuationColumns(points(), [{ fromHz: 8e6, toHz: 9e6 }, { fromHz: 0.5e6, toHz: 1e6 }]).frequencyHz).toHaveLength(4);
  });
  test('uncertainty lies around an exact value and only below a bound', () => {
    const { lowerDb, upperDb } = attenuationColumns(points(), []);
    expect(lowerDb).toEqual([null, 64, null, 55]);
    expect(upperDb).toEqual([null, 68, null, 58]);
  });
  test('no points, no columns', () => {
    const nothing = points({ frequencyHz: [], attenuationDb: [], atLeast: [], ceilingDb: [], expandedUncertaintyDb: [], requiredDb: [] });
    expect(attenuationColumns(nothing, []).frequencyHz).toEqual([]);
  });
});
