import type { FileBody } from '@leeside/contracts/files';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test, vi } from 'vitest';
import { FileQuestions } from './FileQuestions';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const file: FileBody = {
  id: '0b9d3a52-1c1f-4a63-9d3f-0a1b2c3d4e5f', sessionId: '0b9d3a52-1c1f-4a63-9d3f-0a1b2c3d4e50', name: 'readings.csv', sha256: 'a'.repeat(64), bytes: 10, state: 'needs answer',
  uploadedAt: '2026-11-30T09:00:00Z', setAsideAt: null, doubts: [], traces: [],
  questions: [{ id: 'frequency-unit', code: 'frequency-unit', message: 'The file does not tell the unit of its frequencies.', lines: [1], choices: [{ id: 'MHz', label: 'MHz', sample: '100 MHz' }, { id: 'GHz', label: 'GHz', sample: '100 GHz' }] }],
};

const show = (mayAnswer: boolean) => {
  const sent = vi.fn((_url: string, _request: { body: string }) => Promise.resolve(new Response(JSON.stringify({ ...file, state: 'waiting', questions: [] }), { status: 202 })));
  vi.stubGlobal('fetch', sent);
  render(<QueryClientProvider client={new QueryClient()}><FileQuestions file={file} mayAnswer={mayAnswer} /></QueryClientProvider>);
  return sent;
};

test('one click answers, with what the rows would then say in sight', async () => {
  const sent = show(true);
  expect(screen.getByText('100 GHz')).toBeTruthy();
  await userEvent.click(screen.getByLabelText('Read later files of this layout the same way'));
  await userEvent.click(screen.getByRole('button', { name: /GHz/ }));
  await waitFor(() => expect(sent).toHaveBeenCalledOnce());
  const [url, request] = sent.mock.calls[0] ?? [];
  expect(url).toBe(`/api/v1/files/${file.id}/answers`);
  expect(JSON.parse(request?.body ?? '')).toEqual({ answers: [{ questionId: 'frequency-unit', choiceId: 'GHz' }], remember: true });
});
test('who may not answer sees the question and no way to click', () => {
  show(false);
  expect(screen.getByText('An engineer has to answer this.')).toBeTruthy();
  expect(screen.getByRole('button', { name: /MHz/ }).matches(':disabled')).toBe(true);
});
