import { isRouteErrorResponse, Link, useRouteError } from 'react-router-dom';
import { Button } from '../components/Button';
import { Wordmark } from './Wordmark';

/** What stands where a page broke or does not exist. */
export function PageProblem() {
  const error = useRouteError();
  const missing = isRouteErrorResponse(error) && error.status === 404;
  const stale = error instanceof TypeError && /dynamically imported module/i.test(error.message);
  return (
    <main className="mx-auto max-w-2xl px-5 py-10">
      <p className="mb-12 border-b border-edge pb-4"><Wordmark /></p>
      <h1 className="mb-3 text-2xl">{missing ? 'There is no such page' : stale ? 'Leeside was renewed meanwhile' : 'This page broke'}</h1>
      <p className="mb-5 text-faded">
        {missing ? 'The address may be mistyped, or what it stood for was taken away.' : stale ? 'Load the page again to get the present one. What you typed is kept.' : `It is our fault: ${error instanceof Error ? error.message : 'unknown'}. Nothing that was stored is lost.`}
      </p>
      <p className="flex items-center gap-4">{!missing && <Button kind="main" onClick={() => location.reload()}>Load again</Button>}<Link to="/">To Today</Link></p>
    </main>
  );
}
