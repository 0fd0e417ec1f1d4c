import type { ReactNode, TdHTMLAttributes, ThHTMLAttributes } from 'react';

/** Hairlines between rows, a heavier rule under the head; wide tables scroll inside their own frame. */
export function Table({ caption, children, className = '' }: { caption: string; children: ReactNode; className?: string }) {
  return (
    <div className="relative overflow-x-auto" role="region" aria-label={`${caption}, table`} tabIndex={0}>
      <table className={`w-full border-collapse text-sm ${className}`}>
        <caption className="sr-only">{caption}</caption>
        {children}
      </table>
    </div>
  );
}

const alignments = { start: 'text-start', end: 'text-end' } as const;
type Align = { figure?: boolean };

export function HeadCell({ figure = false, className = '', ...rest }: ThHTMLAttributes<HTMLTableCellElement> & Align) {
  return <th scope="col" className={`border-b-2 border-ink px-2 py-1.5 align-bottom text-xs font-semibold text-faded first:ps-0 last:pe-0 ${alignments[figure ? 'end' : 'start']} ${className}`} {...rest} />;
}

export function Cell({ figure = false, className = '', ...rest }: TdHTMLAttributes<HTMLTableCellElement> & Align) {
  return <td className={`border-b border-rule px-2 py-2 align-top first:ps-0 last:pe-0 ${alignments[figure ? 'end' : 'start']} ${className}`} {...rest} />;
}
