import { useState } from 'react';

interface InlineTextProps {
  label: string;
  value: string;
  unit?: string;
  disabled?: boolean;
  /** Says what is wrong with a text, or nothing. */
  check?: (text: string) => string | null;
  onSave: (text: string) => void;
}

/** A text that is edited where it stands: saved by Enter or by leaving it, put back by Esc. */
export function InlineText({ label, value, unit, disabled = false, check = () => null, onSave }: InlineTextProps) {
  const [draft, setDraft] = useState<string | null>(null);
  const trouble = draft === null ? null : check(draft);
  const finish = (): void => {
    if (draft === null || trouble) return;
    if (draft !== value) onSave(draft);
    setDraft(null);
  };
  return (
    <label className="block text-xs text-faded">
      {label}
      <span className="flex items-center gap-1 text-ink">
        <input
          className="field field-quiet" value={draft ?? value} disabled={disabled} aria-invalid={Boolean(trouble)}
          onChange={(event) => setDraft(event.target.value)} onBlur={finish}
          onKeyDown={(event) => {
            if (event.key === 'Enter') event.currentTarget.blur();
            if (event.key === 'Escape') setDraft(null);
          }}
        />
        {unit && <span className="figure text-faded">{unit}</span>}
      </span>
      {trouble && <span role="alert" className="block text-plum">{trouble}</span>}
    </label>
  );
}
