import { expect, test } from 'vitest';
import { readSessionEvent } from './session-events';

const id = '0b9d3a52-1c1f-4a63-9d3f-0a1b2c3d4e5f';

test('an event is understood with its kind from the stream or from its data', () => {
  expect(readSessionEvent('file', JSON.stringify({ id, name: 'a.csv', state: 'read' }))).toEqual({ kind: 'file', id, name: 'a.csv', state: 'read' });
  expect(readSessionEvent('curve', JSON.stringify({ kind: 'curve', id, state: 'ready' }))).toEqual({ kind: 'curve', id, state: 'ready' });
});
test('what is not understood is left alone', () => {
  expect(readSessionEvent('file', 'not json')).toBeNull();
  expect(readSessionEvent('file', JSON.stringify({ id, name: 'a.csv', state: 'lost' }))).toBeNull();
});
