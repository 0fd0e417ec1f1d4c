import { expect, test } from 'vitest';
import { isSettled, progressInWords } from './progress-in-words';

const none = { waiting: 0, reading: 0, read: 0, needsAnswer: 0, refused: 0, curvesPending: 0, curvesReady: 0 };

test('says what is under way, what is done and what is stuck', () => {
  expect(progressInWords({ ...none, waiting: 1, reading: 1, read: 3, needsAnswer: 1, refused: 2, curvesPending: 1 }, 4))
    .toBe('4 files on the way, 2 files to be read, 3 read, 1 needs an answer, 2 refused, 1 curve being computed.');
});
test('says nothing where nothing has begun', () => expect(progressInWords(none, 0)).toBe(''));
test('a session rests when nothing is waiting, read or computed', () => {
  expect(isSettled({ ...none, read: 3, refused: 1, curvesReady: 1 })).toBe(true);
  expect(isSettled({ ...none, curvesPending: 1 })).toBe(false);
});
