import { expect, test } from 'vitest';
import { levelColumns, levelSeriesData } from './levels-data';

const levels = { frequencyHz: [1e6, 2e6], referenceLevel: [-20, -21], enclosedLevel: [-90, null], floorLevel: [-110, -109], levelUnit: 'dBm' };

test('reference, enclosed and floor keep their places; what is missing stays missing', () => {
  const columns = levelColumns(levels, []);
  expect(columns).toEqual({ frequencyHz: [1e6, 2e6], reference: [-20, -21], enclosed: [-90, null], floor: [-110, -109] });
  expect(levelSeriesData(columns)).toEqual([[1e6, 2e6], [-110, -109], [-90, null], [-20, -21]]);
});
test('a gap parts the lines', () => {
  expect(levelColumns(levels, [{ fromHz: 1.2e6, toHz: 1.8e6 }]).reference).toEqual([-20, null, -21]);
});
