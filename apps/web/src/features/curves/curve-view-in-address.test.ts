import { expect, test } from 'vitest';
import { readCurveView, writeCurveView } from './curve-view-in-address';

test('a view survives the address', () => {
  const view = { zoom: { fromHz: 433.92e6, toHz: 2.4e9 }, axisKind: 'linear', rows: 'bounds' } as const;
  expect(readCurveView(writeCurveView(new URLSearchParams(), view))).toEqual(view);
});
test('defaults are left out and other words are kept', () => {
  expect(writeCurveView(new URLSearchParams('from=1&to=2&tab=x'), { zoom: null, axisKind: 'log', rows: 'all' }).toString()).toBe('tab=x');
});
test.each(['from=2&to=1', 'from=a&to=5', 'from=-1&to=5', 'from=5'])('%s is no window', (text) =>
  expect(readCurveView(new URLSearchParams(text)).zoom).toBeNull());
