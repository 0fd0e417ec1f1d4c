import type { ReactNode } from 'react';

/** An empty list says what belongs here and what to do first. */
export function EmptyState({ title, children, action }: { title: string; children?: ReactNode; action?: ReactNode }) {
  return (
    <div className="hatched border border-rule p-1.5">
      <div className="bg-paper px-5 py-6">
        <p className="font-semibold">{title}</p>
        {children && <div className="mt-1 max-w-prose text-sm text-faded">{children}</div>}
        {action && <div className="mt-4">{action}</div>}
      </div>
    </div>
  );
}
