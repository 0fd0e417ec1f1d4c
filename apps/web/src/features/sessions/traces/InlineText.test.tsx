import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test, vi } from 'vitest';
import { InlineText } from './InlineText';
import { checkLevel } from './typed-decibels';

afterEach(cleanup);

const show = (value: string) => {
  const onSave = vi.fn();
  render(<InlineText label="Chain loss" value={value} check={checkLevel('dB', -200, 200)} onSave={onSave} />);
  return { onSave, field: screen.getByLabelText<HTMLInputElement>(/Chain loss/) };
};

test('Enter saves what was typed', async () => {
  const { onSave, field } = show('');
  await userEvent.type(field, '1,5 dB{Enter}');
  expect(onSave).toHaveBeenCalledExactlyOnceWith('1,5 dB');
});
test('leaving it unchanged saves nothing', async () => {
  const { onSave, field } = show('2');
  await userEvent.click(field);
  await userEvent.tab();
  expect(onSave).not.toHaveBeenCalled();
});
test('Esc puts the old text back', async () => {
  const { onSave, field } = show('2');
  await userEvent.type(field, '99{Escape}');
  expect(field.value).toBe('2');
  await userEvent.tab();
  expect(onSave).not.toHaveBeenCalled();
});
test('what is not understood stays, is said, and is not saved', async () => {
  const { onSave, field } = show('');
  await userEvent.type(field, 'ten{Enter}');
  expect(screen.getByRole('alert').textContent).toBe('Not a number in dB: “ten”.');
  expect(field.value).toBe('ten');
  expect(onSave).not.toHaveBeenCalled();
});
