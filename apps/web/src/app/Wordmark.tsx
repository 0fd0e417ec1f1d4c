/** Waves meet a wall; behind it, on the lee side, it is calm. */
export function WaveAndWall({ className = '' }: { className?: string }) {
  return (
    <svg viewBox="0 0 46 24" className={className} fill="none" strokeWidth="2.200" strokeLinecap="round" aria-hidden="true">
      <path d="M2 12c2.200-9 4.400-9 6.600 0s4.400 9 6.600 0 3.200-7.500 5-7.500" stroke="var(--copper)" />
      <path d="M24 2v20" stroke="var(--ink)" strokeWidth="3.600" strokeLinecap="butt" />
      <path d="M28 12q2-2.200 4 0t4 0 4 0 4 0" stroke="var(--patina)" />
    </svg>
  );
}

export function Wordmark() {
  return (
    <span className="inline-flex items-center gap-2 text-lg font-semibold tracking-tight text-ink">
      <WaveAndWall className="h-5 w-auto" />
      Leeside
    </span>
  );
}
