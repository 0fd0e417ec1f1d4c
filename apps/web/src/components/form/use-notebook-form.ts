import { zodResolver } from '@hookform/resolvers/zod';
import { useEffect, useState, type FormEvent } from 'react';
import { useForm, type FieldValues, type Path, type UseFormReturn } from 'react-hook-form';
import type { z } from 'zod';
import { problemOf } from '../../api-client/api-problem';
import type { FieldError } from '../ErrorSummary';
import { fieldErrors, fieldIdOf, fieldOfPointer } from './field-errors';
import { keptDraft } from './kept-draft';

interface Settings<Input extends FieldValues, Output> {
  id: string;
  schema: z.ZodType<Output, Input>;
  empty: Input;
  save: (values: Output) => Promise<void>;
  /** Secrets are never kept as a draft. */
  keepsDraft?: boolean;
}

export interface NotebookForm<Input extends FieldValues, Output> {
  form: UseFormReturn<Input, unknown, Output>;
  field: (path: Path<Input>) => ReturnType<UseFormReturn<Input, unknown, Output>['register']> & { id: string; error: string | undefined };
  errors: FieldError[];
  attempt: number;
  saving: boolean;
  submit: (event: FormEvent) => void;
}

function messageAt(errors: readonly FieldError[], fieldId: string): string | undefined {
  return errors.find((error) => error.fieldId === fieldId)?.message;
}

/** A form of the notebook: checked when sent, errors at the fields and in a summary, what was typed kept until it is saved. */
export function useNotebookForm<Input extends FieldValues, Output>({ id, schema, empty, save, keepsDraft = true }: Settings<Input, Output>): NotebookForm<Input, Output> {
  const [initial] = useState(() => (keepsDraft ? keptDraft.read(id, empty) : empty));
  const [attempt, setAttempt] = useState(0);
  const form = useForm<Input, unknown, Output>({
    resolver: zodResolver<Input, unknown, Output>(schema), shouldFocusError: false,
    values: initial,
  });
  const { subscribe } = form;
  useEffect(() => (keepsDraft ? subscribe({ formState: { values: true }, callback: ({ values }) => keptDraft.write(id, values) }) : undefined), [subscribe, id, keepsDraft]);

  const showProblem = (failure: unknown): void => {
    const problem = problemOf(failure);
    const placed = problem.errors.map((error) => ({ path: fieldOfPointer(error, Object.keys(empty)), message: error.message }));
    for (const { path, message } of placed) if (path) form.setError(path as Path<Input>, { message });
    if (!placed.some(({ path }) => path)) form.setError('root.server', { message: problem.detail || problem.title });
  };

  const send = form.handleSubmit(async (values) => {
    try {
      await save(values);
      if (keepsDraft) keptDraft.drop(id);
    } catch (failure) {
      showProblem(failure);
    }
  });
  const errors = fieldErrors(form.formState.errors, id);
  return {
    form, errors, attempt, saving: form.formState.isSubmitting,
    field: (path) => {
      const fieldId = fieldIdOf(id, path);
      return { ...form.register(path), id: fieldId, error: messageAt(errors, fieldId) };
    },
    submit: (event) => {
      event.preventDefault();
      void send(event).finally(() => setAttempt((count) => count + 1));
    },
  };
}
