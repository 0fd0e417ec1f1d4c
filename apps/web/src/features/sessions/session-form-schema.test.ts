import { createSession } from '@leeside/contracts/sessions';
import { expect, test } from 'vitest';
import { sessionBody, sessionFormSchema } from './session-form-schema';

const typed = { title: ' Pouches ', heldOn: '2026-11-30', requirementId: '', impedanceOhm: '75', floorMarginDb: '10' as const, notes: '' };

test('what is typed becomes a body that the contract takes', () => {
  const body = sessionBody(sessionFormSchema.parse(typed));
  expect(body).toEqual({ title: 'Pouches', heldOn: '2026-11-30', floorMarginDb: 10, impedanceOhm: 75 });
  expect(createSession.body.safeParse(body).success).toBe(true);
});
test('a missing title and a wrong day are said', () => {
  const answer = sessionFormSchema.safeParse({ ...typed, title: ' ', heldOn: '30.11.2026' });
  expect(answer.error?.issues.map(({ message }) => message)).toEqual(['Title is missing. Say what was measured.', 'Bench day is missing or no date.']);
});
