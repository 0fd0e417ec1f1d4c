import { getMe } from '@leeside/contracts/authentication';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { Navigate, Outlet, useLocation, useNavigate } from 'react-router-dom';
import { ApiProblem } from '../api-client/api-problem';
import { csrfToken } from '../api-client/csrf-token';
import { signedOut } from '../api-client/signed-out';
import { queryKeyOf, useApiQuery } from '../api-client/use-api-query';
import { ErrorState } from '../components/ErrorState';
import { SignedInContext } from './session-context';

const signInAddress = (path: string): string => (path === '/' ? '/sign-in' : `/sign-in?then=${encodeURIComponent(path)}`);

/** Everything behind it knows who is signed in; others are led to the sign-in page and back again. */
export function SignedInGate() {
  const { pathname, search } = useLocation();
  const navigate = useNavigate();
  const client = useQueryClient();
  const me = useApiQuery(getMe, {}, { staleTime: Infinity });
  const here = pathname + search;

  useEffect(() => signedOut.subscribe(() => {
    client.removeQueries({ queryKey: queryKeyOf(getMe, {}) });
    void navigate(signInAddress(here), { replace: true });
  }), [client, navigate, here]);

  const token = me.data?.csrfToken;
  useEffect(() => {
    if (token) csrfToken.set(token);
  }, [token]);

  if (me.data) return <SignedInContext value={me.data.user}><Outlet /></SignedInContext>;
  if (me.error instanceof ApiProblem && me.error.status === 401) return <Navigate to={signInAddress(here)} replace />;
  if (me.isError) return <main className="mx-auto max-w-xl p-6"><ErrorState error={me.error} what="Leeside does not answer" onRetry={() => void me.refetch()} /></main>;
  return <p role="status" className="p-6 text-faded">Opening the notebook …</p>;
}
