import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { ErrorState } from './ErrorState';
import { LoadingLines } from './LoadingLines';

interface AnsweredProps<Answer> { query: UseQueryResult<Answer>; what: string; loading?: ReactNode; children: (answer: Answer) => ReactNode }

/** The loading and the error state of anything asked of the API; what was answered before stays on show. */
export function Answered<Answer>({ query, what, loading, children }: AnsweredProps<Answer>) {
  if (query.data !== undefined) return children(query.data);
  if (query.isError) return <ErrorState error={query.error} what={`${what.charAt(0).toUpperCase()}${what.slice(1)} could not be loaded`} onRetry={() => void query.refetch()} />;
  return loading ?? <LoadingLines what={what} />;
}
