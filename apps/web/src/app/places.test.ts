import type { User } from '@leeside/contracts/authentication';
import type { Role } from '@leeside/contracts/roles';
import { expect, test } from 'vitest';
import { isAt, placesFor } from './places';

const person = (...roles: Role[]): User => ({ id: crypto.randomUUID(), name: 'A', email: 'a@b', roles, clientId: null, labName: 'Lab' });

test('a client sees their own samples and tokens and nothing of the lab', () => {
  expect(placesFor(person('client')).map((place) => place.word)).toEqual(['Your samples', 'Tokens']);
});

test('an engineer sees the lab and no client page', () => {
  expect(placesFor(person('engineer')).map((place) => place.word)).toEqual(['Today', 'Sessions', 'Samples', 'Requirements', 'Tokens']);
});

test('curves and files lie in the sessions, and Today is only itself', () => {
  const [today, sessions] = placesFor(person('engineer'));
  expect(sessions && ['/sessions/1', '/curves/1', '/files/1', '/samples'].map((path) => isAt(sessions, path))).toEqual([true, true, true, false]);
  expect(today && ['/', '/sessions'].map((path) => isAt(today, path))).toEqual([true, false]);
});
