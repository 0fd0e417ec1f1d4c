const keyOf = (formId: string): string => `leeside.draft.${formId}`;

const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null && !Array.isArray(value);

/** What was typed and not yet saved, kept in this browser. A draft of another shape is dropped. */
export const keptDraft = {
  read<Values extends object>(formId: string, empty: Values): Values {
    try {
      const kept: unknown = JSON.parse(localStorage.getItem(keyOf(formId)) ?? 'null');
      const sameShape = isRecord(kept) && Object.entries(empty).every(([name, value]) => typeof kept[name] === typeof value);
      return sameShape ? { ...empty, ...kept } : empty;
    } catch {
      return empty;
    }
  },
  write(formId: string, values: object): void {
    try {
      localStorage.setItem(keyOf(formId), JSON.stringify(values));
    } catch {
      // A full or forbidden store: the form goes on without a draft.
    }
  },
  drop(formId: string): void {
    localStorage.removeItem(keyOf(formId));
  },
};
