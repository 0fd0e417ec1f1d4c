import { signOut } from '@leeside/contracts/authentication';
import { useQueryClient } from '@tanstack/react-query';
import { Link, useLocation, useNavigate } from 'react-router-dom';
import { callApi } from '../api-client/call-api';
import { csrfToken } from '../api-client/csrf-token';
import { Button } from '../components/Button';
import { isAt, placesFor } from './places';
import { useSignedIn } from './session-context';
import { Wordmark } from './Wordmark';

function useLeave(): () => Promise<void> {
  const client = useQueryClient();
  const navigate = useNavigate();
  return async () => {
    await callApi(signOut, {}).catch(() => null);
    csrfToken.set(null);
    client.clear();
    await navigate('/sign-in');
  };
}

/** The narrow strip of places at the left of a wide page. */
export function Spine() {
  const user = useSignedIn();
  const { pathname } = useLocation();
  const leave = useLeave();
  return (
    <header className="stitched not-printed sticky top-0 hidden h-dvh w-40 shrink-0 flex-col py-6 ps-5 desk:flex">
      <Link to="/" className="no-underline"><Wordmark /></Link>
      <nav aria-label="Places" className="mt-9">
        <ul className="list-none">
          {placesFor(user).map((place) => (
            <li key={place.to}>
              <Link to={place.to} aria-current={isAt(place, pathname) ? 'page' : undefined} className={`-ms-2.5 block py-1.5 ps-2.5 no-underline ${isAt(place, pathname) ? 'ribbon font-semibold' : 'text-ink hover:underline'}`}>
                {place.word}
              </Link>
            </li>
          ))}
        </ul>
      </nav>
      <div className="mt-auto pe-3 text-xs text-faded">
        <p className="font-semibold text-ink wrap-anywhere">{user.name}</p>
        <p>{user.roles.join(', ')}</p>
        <p>{user.labName}</p>
        <Button kind="quiet" className="-ms-1.5 mt-1 text-xs" onClick={() => void leave()}>Sign out</Button>
      </div>
    </header>
  );
}

/** The same places as a bar at the bottom of a narrow page. */
export function BottomBar() {
  const user = useSignedIn();
  const { pathname } = useLocation();
  return (
    <nav aria-label="Places" className="not-printed fixed inset-x-0 bottom-0 z-10 border-t border-edge bg-paper desk:hidden">
      <ul className="flex list-none justify-around overflow-x-auto">
        {placesFor(user).map((place) => (
          <li key={place.to} className="shrink-0">
            <Link to={place.to} aria-current={isAt(place, pathname) ? 'page' : undefined} className={`flex min-h-12 items-center border-t-4 px-1.5 text-xs no-underline ${isAt(place, pathname) ? 'border-copper font-semibold text-copper' : 'border-transparent text-ink'}`}>
              {place.word}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}

export function TopLine() {
  const user = useSignedIn();
  const leave = useLeave();
  return (
    <header className="not-printed flex items-center justify-between gap-3 border-b border-rule px-4 py-2 desk:hidden">
      <Wordmark />
      <span className="flex items-center gap-2 text-xs text-faded">{user.name}<Button kind="quiet" className="text-xs" onClick={() => void leave()}>Sign out</Button></span>
    </header>
  );
}
