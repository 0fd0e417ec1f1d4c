import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test } from 'vitest';
import { ErrorSummary } from './ErrorSummary';

afterEach(cleanup);

const errors = [{ fieldId: 'title', message: 'Title is missing.' }];

test('takes the focus, names the fault in the page’s title, and leads to the field', async () => {
  document.title = 'New session';
  const { rerender } = render(<><ErrorSummary errors={errors} attempt={1} /><input id="title" aria-label="Title" /></>);
  expect(document.activeElement).toBe(screen.getByRole('alert'));
  expect(document.title).toBe('Error: New session');
  await userEvent.click(screen.getByRole('link', { name: 'Title is missing.' }));
  expect(document.activeElement).toBe(screen.getByLabelText('Title'));
  rerender(<ErrorSummary errors={[]} attempt={2} />);
  expect(document.title).toBe('New session');
  expect(screen.queryByRole('alert')).toBeNull();
});
