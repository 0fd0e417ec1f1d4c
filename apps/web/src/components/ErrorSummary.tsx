import { useEffect, useRef } from 'react';

export interface FieldError { fieldId: string | null; message: string }

/** Stands at the top of a form that could not be saved; takes the focus whenever a new attempt failed. */
export function ErrorSummary({ errors, attempt }: { errors: readonly FieldError[]; attempt: number }) {
  const place = useRef<HTMLDivElement>(null);
  const any = errors.length > 0;
  useEffect(() => {
    if (any) place.current?.focus();
  }, [any, attempt]);
  useEffect(() => {
    if (!any) return undefined;
    const before = document.title;
    document.title = `Error: ${before.replace(/^Error: /, '')}`;
    return () => {
      document.title = before;
    };
  }, [any]);
  if (!any) return null;
  return (
    <div ref={place} tabIndex={-1} role="alert" className="mb-6 max-w-xl border-2 border-plum bg-sheet p-4">
      <h2 className="mb-2 text-lg text-plum">This cannot be saved yet</h2>
      <ul className="list-none space-y-1">
        {errors.map(({ fieldId, message }) => (
          <li key={`${fieldId ?? ''} ${message}`}>
            {fieldId ? <a href={`#${fieldId}`} onClick={(event) => { event.preventDefault(); document.getElementById(fieldId)?.focus(); }}>{message}</a> : message}
          </li>
        ))}
      </ul>
    </div>
  );
}
