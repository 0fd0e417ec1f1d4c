import { expect, test } from 'vitest';
import { placeAfterSignIn } from './place-after-sign-in';

test.each([
  ['/curves/1?from=1', '/curves/1?from=1'], ['//elsewhere.example', '/'], ['/\\elsewhere.example', '/'],
  ['https://elsewhere.example', '/'], [null, '/'],
])('%s leads to %s', (asked, place) => expect(placeAfterSignIn(asked, ['engineer'])).toBe(place));

test('a client starts at their own samples', () => expect(placeAfterSignIn(null, ['client'])).toBe('/samples'));
