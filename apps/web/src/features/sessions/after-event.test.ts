import type { Session } from '@leeside/contracts/sessions';
import { expect, test } from 'vitest';
import { afterEvent } from './after-event';

const progress = { waiting: 1, reading: 0, read: 0, needsAnswer: 0, refused: 0, curvesPending: 0, curvesReady: 0 };
const session: Session = {
  id: '1', title: 'T', heldOn: '2026-11-30', impedanceOhm: 50, requirementId: null, requirementName: null, floorMarginDb: 6, notes: null,
  createdAt: '2026-11-30T09:00:00Z', createdByName: 'E', files: [{ id: 'a', name: 'a.csv', state: 'waiting', setAsideAt: null }], progress,
};

test('a file event changes the state of that file', () => {
  expect(afterEvent(session, { kind: 'file', id: 'a', name: 'a.csv', state: 'read' }).files[0]?.state).toBe('read');
});
test('a file that another tab brought in appears', () => {
  expect(afterEvent(session, { kind: 'file', id: 'b', name: 'b.csv', state: 'waiting' }).files.map(({ name }) => name)).toEqual(['a.csv', 'b.csv']);
});
test('progress is taken over, a curve changes nothing here', () => {
  expect(afterEvent(session, { kind: 'progress', progress: { ...progress, waiting: 0, read: 1 } }).progress.read).toBe(1);
  expect(afterEvent(session, { kind: 'curve', id: 'c', state: 'ready' })).toBe(session);
});
