import { useEffect, type ReactNode } from 'react';

interface PageHeadProps { title: string; folio?: ReactNode; action?: ReactNode; broad?: boolean; children?: ReactNode }

/** The top of the sheet: where this page stands, its title, and its one main action. Broad where nothing is remarked beside it. */
export function PageHead({ title, folio, action, broad = false, children }: PageHeadProps) {
  useEffect(() => {
    document.title = `${title} · Leeside`;
  }, [title]);
  return (
    <header className={`mb-8 grid grid-cols-[minmax(0,1fr)] gap-x-10 ${broad ? '' : 'wide:grid-cols-[minmax(0,1fr)_17rem]'}`}>
      <div>
        {folio && <p className="mb-1 text-sm text-faded">{folio}</p>}
        <div className="flex flex-wrap items-start justify-between gap-x-6 gap-y-3">
          <h1 className="text-2xl wrap-anywhere">{title}</h1>
          {action && <div className="flex shrink-0 flex-wrap gap-2">{action}</div>}
        </div>
        {children && <div className="mt-3">{children}</div>}
      </div>
    </header>
  );
}
