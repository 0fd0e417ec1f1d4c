import { expect, test } from 'vitest';
import { nameOfWall, requiredAt, wallTop } from './requirement-wall';

const sloping = { fromHz: 1e6, toHz: 1e9, fromDb: 80, toDb: 50 };

test('a segment is straight in the logarithm of frequency', () => {
  expect(requiredAt(sloping, 1e7)).toBeCloseTo(70, 9);
  expect(requiredAt(sloping, 1e6)).toBe(80);
  expect(requiredAt(sloping, 2e9)).toBeNull();
});
test('the wall is cut at the edges of the window', () => {
  const top = wallTop(sloping, { fromHz: 1e7, toHz: 1e8 });
  expect(top?.at(0)?.hz).toBeCloseTo(1e7, 0);
  expect(top?.at(0)?.db).toBeCloseTo(70, 9);
  expect(top?.at(-1)?.hz).toBeCloseTo(1e8, 0);
  expect(top?.at(-1)?.db).toBeCloseTo(60, 9);
});
test('no wall where the window does not meet the segment', () => expect(wallTop(sloping, { fromHz: 2e9, toHz: 3e9 })).toBeNull());

test('the name stands at the edge where the wall reaches it or nearly, else at the end of the wall', () => {
  expect(nameOfWall([sloping], { fromHz: 1e7, toHz: 1e8 })).toMatchObject({ at: 'edge', hz: 1e8 });
  expect(nameOfWall([sloping], { fromHz: 1e7, toHz: 1.05e9 })).toMatchObject({ at: 'edge', db: 50 });
  expect(nameOfWall([sloping], { fromHz: 1e7, toHz: 6e9 })).toEqual({ at: 'own end', hz: 1e9, db: 50 });
  expect(nameOfWall([sloping], { fromHz: 2e9, toHz: 6e9 })).toBeNull();
});
