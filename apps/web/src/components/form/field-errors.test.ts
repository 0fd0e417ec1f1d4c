import { expect, test } from 'vitest';
import { fieldErrors, fieldOfPointer } from './field-errors';

test('errors of nested fields carry the ids of their fields', () => {
  const errors = { name: { type: 'custom', message: 'Name is missing.' }, segments: [{ toHz: { type: 'custom', message: 'Too low.' } }] };
  expect(fieldErrors(errors, 'requirement')).toEqual([
    { fieldId: 'requirement-name', message: 'Name is missing.' },
    { fieldId: 'requirement-segments-0-toHz', message: 'Too low.' },
  ]);
});

test('an error of the whole form links nowhere', () => {
  expect(fieldErrors({ root: { server: { message: 'Not now.' } } }, 'x')).toEqual([{ fieldId: null, message: 'Not now.' }]);
});

test('a pointer of the server finds the field, and only a field of this form', () => {
  const at = (pointer: string) => fieldOfPointer({ pointer, code: 'x', message: 'y' }, ['segments', 'name']);
  expect(at('/segments/0/toHz')).toBe('segments.0.toHz');
  expect(at('/elsewhere')).toBeNull();
});
