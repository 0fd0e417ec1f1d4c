import { expect, test } from 'vitest';
import { problemFrom, problemOf } from './api-problem';

const body = { type: '/problems/invalid', title: 'Not valid', status: 422, detail: 'heldOn is no date.', instance: '/x', requestId: 'r', errors: [{ pointer: '/heldOn', code: 'invalid', message: 'No date.' }] };

test('a problem of the API is taken as it is', () => {
  const problem = problemFrom(422, JSON.stringify(body));
  expect([problem.status, problem.detail, problem.errors[0]?.pointer, problem.requestId]).toEqual([422, 'heldOn is no date.', '/heldOn', 'r']);
});
test('a page of a proxy is told by its status', () => {
  expect(problemFrom(413, '<html>413</html>').detail).toBe('A proxy on the way refused the upload as too large.');
  expect(problemFrom(418, '').detail).toBe('The server answered with status 418.');
});
test('any other failure is said in its own words', () => expect(problemOf(new Error('no')).detail).toBe('no'));
