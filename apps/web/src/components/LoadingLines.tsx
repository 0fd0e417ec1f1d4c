/** Keeps the place of what is coming. */
export function LoadingLines({ what, lines = 3, tall = false }: { what: string; lines?: number; tall?: boolean }) {
  return (
    <div role="status" className="space-y-3 py-1">
      <span className="sr-only">{`Loading ${what}`}</span>
      {Array.from({ length: lines }, (_, line) => (
        <div key={line} aria-hidden="true" className={`waiting-line ${tall ? 'h-72' : 'h-6'} ${line % 3 === 2 ? 'w-2/3' : 'w-full'}`} />
      ))}
    </div>
  );
}
