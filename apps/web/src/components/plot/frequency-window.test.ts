import { describe, expect, test } from 'vitest';
import { clampWindow, followWindow, nearestIndex, widened, zoomWindow } from './frequency-window';

const whole = { fromHz: 10e6, toHz: 1e9 };

describe('a window of frequencies', () => {
  test('zooming in on a logarithmic axis keeps the centre where it is', () => {
    const { fromHz, toHz } = zoomWindow(whole, whole, { aboutHz: 100e6, factor: 0.5, kind: 'log' });
    expect(Math.sqrt(fromHz * toHz)).toBeCloseTo(100e6, 0);
    expect(toHz / fromHz).toBeCloseTo(10, 9);
  });
  test('zooming out ends at the whole', () => {
    expect(zoomWindow({ fromHz: 20e6, toHz: 40e6 }, whole, { aboutHz: 30e6, factor: 100, kind: 'linear' })).toEqual(whole);
  });
  test('a window drawn backwards is the same window', () => {
    expect(clampWindow({ fromHz: 50e6, toHz: 20e6 }, whole)).toEqual({ fromHz: 20e6, toHz: 50e6 });
  });
  test('a window without width, or outside, is the whole', () => {
    expect(clampWindow({ fromHz: 50e6, toHz: 50e6 }, whole)).toEqual(whole);
    expect(clampWindow({ fromHz: 2e9, toHz: 3e9 }, whole)).toEqual(whole);
  });
  test('it follows a cursor that leaves it', () => {
    const moved = followWindow({ fromHz: 10e6, toHz: 20e6 }, whole, 100e6, 'log');
    expect(moved.fromHz).toBeLessThan(100e6);
    expect(moved.toHz).toBeGreaterThan(100e6);
    expect(moved.toHz / moved.fromHz).toBeCloseTo(2, 9);
  });
});

test('the nearest index', () => {
  const axis = [10, 20, 40];
  expect([5, 14, 16, 31, 99].map((hz) => nearestIndex(axis, hz))).toEqual([0, 0, 1, 2, 2]);
  expect(nearestIndex([], 1)).toBe(-1);
});

test('a widened window reaches past both edges by the same share', () => {
  const { fromHz, toHz } = widened({ fromHz: 10e6, toHz: 1e9 });
  expect(10e6 / fromHz).toBeCloseTo(toHz / 1e9, 9);
  expect(fromHz).toBeLessThan(10e6);
});
