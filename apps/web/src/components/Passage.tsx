import type { ReactNode } from 'react';

interface PassageProps { id?: string; title: string; count?: ReactNode; actions?: ReactNode; remarks?: ReactNode; children: ReactNode }

/** One part of a page on the sheet, with its remarks beside it. */
export function Passage({ id, title, count, actions, remarks, children }: PassageProps) {
  return (
    <section id={id} aria-label={title} className="mb-10 grid grid-cols-[minmax(0,1fr)] gap-x-10 wide:grid-cols-[minmax(0,1fr)_17rem]">
      <div className="min-w-0">
        <header className="mb-3 flex flex-wrap items-end justify-between gap-x-4 gap-y-2 border-b border-edge pb-1.5">
          <h2 className="text-lg">{title}{count !== undefined && <span className="figure ms-2 font-normal text-faded">{count}</span>}</h2>
          {actions && <div className="flex flex-wrap items-center gap-2">{actions}</div>}
        </header>
        {children}
      </div>
      <div className="wide:pt-1">{remarks}</div>
    </section>
  );
}
