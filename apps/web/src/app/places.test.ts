import type { User } from '@leeside/contracts/authentication';
import type { Role } from '@leeside/contracts/roles';
import { expect, test } from 'vitest';
import { placesFor } from './places';

const person = (...roles: Role[]): User => ({ id: crypto.randomUUID(), name: 'A', email: 'a@b', roles, clientId: null, labName: 'Lab' });

test('a client sees their own samples and tokens and nothing of the lab', () => {
  expect(placesFor(person('client')).map((place) => place.word)).toEqual(['Your samples', 'Tokens']);
});

test('an engineer sees the lab and no client page', () => {
  expect(placesFor(person('engineer')).map((place) => place.word)).toEqual(['Today', 'Sessions', 'Samples', 'Requirements', 'Tokens']);
});
