import { problemOf } from '../api-client/api-problem';
import { Button } from './Button';

/** What went wrong, what was kept, and what to do. */
export function ErrorState({ error, what, onRetry, kept = 'Nothing was changed.' }: { error: unknown; what: string; onRetry?: () => void; kept?: string }) {
  const problem = problemOf(error);
  return (
    <div role="alert" className="border-s-4 border-plum bg-sheet px-4 py-3">
      <p className="font-semibold text-plum">{what}</p>
      <p className="mt-1 text-sm">{problem.detail || problem.title} {kept}</p>
      {problem.requestId && <p className="mt-1 text-xs text-faded">Request <code>{problem.requestId}</code></p>}
      {onRetry && <Button className="mt-3" onClick={onRetry}>Try again</Button>}
    </div>
  );
}
