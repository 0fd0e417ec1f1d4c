import { useId, type KeyboardEvent, type ReactNode } from 'react';

export interface PlotActions {
  step: (points: number) => void;
  zoom: (factor: number) => void;
  reset: () => void;
  toEnd: (end: 'first' | 'last') => void;
  toLowest: () => void;
}

const actionOf = (event: KeyboardEvent, actions: PlotActions): (() => void) | null => {
  const stride = event.shiftKey ? 10 : 1;
  const table: Record<string, () => void> = {
    ArrowLeft: () => actions.step(-stride), ArrowRight: () => actions.step(stride),
    ArrowDown: () => actions.step(-stride), ArrowUp: () => actions.step(stride),
    PageDown: () => actions.step(-25), PageUp: () => actions.step(25),
    Home: () => actions.toEnd('first'), End: () => actions.toEnd('last'),
    '+': () => actions.zoom(0.5), '=': () => actions.zoom(0.5), '-': () => actions.zoom(2),
    Escape: actions.reset, l: actions.toLowest,
  };
  return table[event.key] ?? null;
};

interface PlotKeysProps { at: number; count: number; aloud: string; summary: string; actions: PlotActions; children: ReactNode }

/** The plots as one control for the keyboard: a slider whose value is what the cursor reads. */
export function PlotKeys({ at, count, aloud, summary, actions, children }: PlotKeysProps) {
  const summaryId = useId();
  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const action = actionOf(event, actions);
    if (!action) return;
    event.preventDefault();
    action();
  };
  return (
    <div
      role="slider" tabIndex={0} aria-label="Attenuation over frequency" aria-describedby={summaryId}
      aria-valuemin={0} aria-valuemax={Math.max(0, count - 1)} aria-valuenow={Math.max(0, at)} aria-valuetext={aloud}
      onKeyDown={onKeyDown} className="relative -mx-2 px-2"
    >
      <p id={summaryId} className="sr-only">{summary} Arrow keys move the cursor, plus and minus zoom, Escape shows the whole, L goes to the lowest.</p>
      {children}
    </div>
  );
}
