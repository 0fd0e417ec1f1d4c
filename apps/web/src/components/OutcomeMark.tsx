import type { Outcome } from '@leeside/contracts/curves';
import type { ReactNode } from 'react';

const colours: Record<Outcome, string> = {
  'meets': 'text-patina',
  'falls short': 'text-plum',
  'too close to call': 'text-ochre',
  'beyond reach': 'text-slate',
  'not all measured': 'text-slate',
};

/** The bar is the requirement; the dot is where the curve stands. */
const drawings: Record<Outcome, ReactNode> = {
  'meets': <><path d="M2 11.500h14" /><circle cx="9" cy="5.500" r="2.600" fill="currentColor" stroke="none" /></>,
  'falls short': <><path d="M2 6.500h14" /><circle cx="9" cy="12.500" r="2.600" fill="currentColor" stroke="none" /></>,
  'too close to call': <><path d="M2 9h14" /><circle cx="9" cy="9" r="3" fill="var(--sheet)" /></>,
  'beyond reach': <><path d="M2 14.500h14" /><path d="M5 9l4-4 4 4" /></>,
  'not all measured': <><path d="M2 9h3.500M12.500 9H16" /><path d="M9 4v1M9 13v1" /></>,
};

export function OutcomeMark({ outcome, large = false }: { outcome: Outcome | null; large?: boolean }) {
  if (!outcome) return <span className="text-faded">no requirement</span>;
  const size = large ? 26 : 18;
  return (
    <span className={`inline-flex items-center gap-1.5 font-semibold whitespace-nowrap ${colours[outcome]} ${large ? 'text-lg' : 'text-sm'}`}>
      <svg width={size} height={size} viewBox="0 0 18 18" fill="none" stroke="currentColor" strokeWidth="1.8" strokeLinecap="round" aria-hidden="true">
        {drawings[outcome]}
      </svg>
      {outcome}
    </span>
  );
}
