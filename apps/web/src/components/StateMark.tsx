import type { ReactNode } from 'react';

interface Look { colour: string; drawing: ReactNode }

const ring = <circle cx="8" cy="8" r="5.500" />;
const tick = <path d="M3.500 8.500l3 3 6-7" />;
const cross = <path d="M4 4l8 8M12 4l-8 8" />;
const query = <><path d="M5.500 6a2.500 2.500 0 1 1 3.700 2.200c-.8.500-1.200.9-1.200 1.800" /><path d="M8 12.600v.1" /></>;
const bars = <path d="M5.500 4v8M10.500 4v8" />;
const work = <path className="turning" d="M8 2.500a5.500 5.500 0 1 1-5.500 5.500" />;

const looks: Record<string, Look> = {
  'waiting': { colour: 'text-faded', drawing: ring },
  'sending': { colour: 'text-copper', drawing: <path d="M8 13V4M4.500 7.500L8 4l3.500 3.500" /> },
  'reading': { colour: 'text-slate', drawing: work },
  'pending': { colour: 'text-slate', drawing: work },
  'read': { colour: 'text-patina', drawing: tick },
  'ready': { colour: 'text-patina', drawing: tick },
  'released': { colour: 'text-patina', drawing: tick },
  'measured': { colour: 'text-patina', drawing: tick },
  'needs answer': { colour: 'text-ochre', drawing: query },
  'refused': { colour: 'text-plum', drawing: cross },
  'failed': { colour: 'text-plum', drawing: cross },
  'no curve yet': { colour: 'text-slate', drawing: ring },
  'held': { colour: 'text-plum', drawing: bars },
  'set aside': { colour: 'text-faded', drawing: bars },
  'received': { colour: 'text-slate', drawing: ring },
  'on the bench': { colour: 'text-copper', drawing: <path d="M2.500 10.500h11M4.500 10.500V13M11.500 10.500V13M5.500 7.500h5" /> },
  'returned': { colour: 'text-faded', drawing: <path d="M13 8H4M7.500 4.500L4 8l3.500 3.500" /> },
};

const unknown: Look = { colour: 'text-faded', drawing: ring };

/** A state with its word and its own mark, never colour alone. */
export function StateMark({ state }: { state: string }) {
  const { colour, drawing } = looks[state] ?? unknown;
  return (
    <span className={`inline-flex items-center gap-1.5 text-sm font-semibold whitespace-nowrap ${colour}`}>
      <svg width="16" height="16" viewBox="0 0 16 16" fill="none" stroke="currentColor" strokeWidth="1.8" strokeLinecap="round" strokeLinejoin="round" aria-hidden="true">
        {drawing}
      </svg>
      {state}
    </span>
  );
}
