import type { ComponentProps, ReactNode } from 'react';

interface FrameProps { id: string; label: string; hint?: ReactNode; error?: string | undefined; unit?: string; optional?: boolean; children: ReactNode }

/** Label above, hint, the field with its unit beside it, and the error in the same words as in the summary. */
export function FieldFrame({ id, label, hint, error, unit, optional, children }: FrameProps) {
  return (
    <div className="mb-5 max-w-xl">
      <label htmlFor={id} className="mb-1 block text-sm font-semibold">
        {label} {optional && <span className="font-normal text-faded">(may be left out)</span>}
      </label>
      {hint && <p id={`${id}-hint`} className="mb-1 text-sm text-faded">{hint}</p>}
      {error && <p id={`${id}-error`} className="mb-1 text-sm font-semibold text-plum">{error}</p>}
      <div className="flex items-center gap-2">
        {children}
        {unit && <span className="figure text-faded">{unit}</span>}
      </div>
    </div>
  );
}

interface Told { id: string; hint?: ReactNode; error?: string | undefined }

const describedBy = ({ id, hint, error }: Told): string | undefined =>
  [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ') || undefined;

type Common = Omit<FrameProps, 'children'>;

export function TextField({ id, label, hint, error, unit, optional, className = '', ...rest }: Common & ComponentProps<'input'>) {
  return (
    <FieldFrame {...{ id, label, hint, error, ...(unit ? { unit } : {}), ...(optional ? { optional } : {}) }}>
      <input id={id} className={`field ${className}`} aria-invalid={Boolean(error)} aria-describedby={describedBy({ id, hint, error })} {...rest} />
    </FieldFrame>
  );
}

export function TextArea({ id, label, hint, error, optional, ...rest }: Common & ComponentProps<'textarea'>) {
  return (
    <FieldFrame {...{ id, label, hint, error, ...(optional ? { optional } : {}) }}>
      <textarea id={id} rows={4} className="field" aria-invalid={Boolean(error)} aria-describedby={describedBy({ id, hint, error })} {...rest} />
    </FieldFrame>
  );
}

export function SelectField({ id, label, hint, error, optional, children, ...rest }: Common & ComponentProps<'select'>) {
  return (
    <FieldFrame {...{ id, label, hint, error, ...(optional ? { optional } : {}) }}>
      <select id={id} className="field" aria-invalid={Boolean(error)} aria-describedby={describedBy({ id, hint, error })} {...rest}>
        {children}
      </select>
    </FieldFrame>
  );
}
