import { outcomes } from '@leeside/contracts/curves';
import { cleanup, render } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { OutcomeMark } from './OutcomeMark';

afterEach(cleanup);

test('every outcome has its word and a mark of its own, so that colour is never alone', () => {
  const marks = outcomes.map((outcome) => {
    const { container } = render(<OutcomeMark outcome={outcome} />);
    expect(container.textContent).toBe(outcome);
    return container.querySelector('svg')?.innerHTML ?? '';
  });
  expect(new Set(marks).size).toBe(outcomes.length);
});
test('no requirement is said, not left blank', () => {
  expect(render(<OutcomeMark outcome={null} />).container.textContent).toBe('no requirement');
});
