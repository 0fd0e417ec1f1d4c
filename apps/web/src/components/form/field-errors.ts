import type { FieldProblem } from '../../api-client/api-problem';
import type { FieldError } from '../ErrorSummary';

export const fieldIdOf = (formId: string, path: string): string => `${formId}-${path.replaceAll('.', '-')}`;

/** The errors of a form, however deep, each with the id of its field, in the order of the form. */
export function fieldErrors(errors: object, formId: string, path = ''): FieldError[] {
  return Object.entries(errors).flatMap(([name, value]: [string, unknown]) => {
    if (typeof value !== 'object' || value === null || name === 'ref') return [];
    const here = path ? `${path}.${name}` : name;
    if ('message' in value && typeof value.message === 'string') {
      const isWhole = name === 'root' || name === 'server';
      return [{ fieldId: isWhole ? null : fieldIdOf(formId, here), message: value.message }];
    }
    return fieldErrors(value, formId, here);
  });
}

/** `/segments/0/toHz` of a problem is `segments.0.toHz` of a form. */
export function fieldOfPointer(problem: FieldProblem, known: readonly string[]): string | null {
  const path = problem.pointer.replace(/^#?\//, '').replace(/^body\//, '').split('/').join('.');
  const first = path.split('.')[0] ?? '';
  return known.includes(first) ? path : null;
}
