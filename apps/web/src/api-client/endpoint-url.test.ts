import { getCurvePoints } from '@leeside/contracts/curves';
import { expect, test } from 'vitest';
import { endpointUrl } from './endpoint-url';

test('braces are filled and absent values left out', () => {
  expect(endpointUrl(getCurvePoints, { params: { id: 'a/b' }, query: { fromHz: 1e9, toHz: undefined, maxPoints: 400 } })).toBe('/api/v1/curves/a%2Fb/points?fromHz=1000000000&maxPoints=400');
});
