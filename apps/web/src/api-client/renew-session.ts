import { getMe, refreshSession, signedInSchema } from '@leeside/contracts/authentication';
import { csrfToken } from './csrf-token';
import { endpointUrl } from './endpoint-url';

let running: Promise<boolean> | null = null;

const keepToken = async (response: Response): Promise<boolean> => {
  if (!response.ok) return false;
  const signedIn = signedInSchema.safeParse(await response.json());
  if (signedIn.success) csrfToken.set(signedIn.data.csrfToken);
  return signedIn.success;
};

const renew = async (): Promise<boolean> => {
  const headers = new Headers();
  const token = csrfToken.get();
  if (token) headers.set('X-CSRF-Token', token);
  try {
    return await keepToken(await fetch(endpointUrl(refreshSession, {}), { method: 'POST', headers }));
  } catch {
    return false;
  }
};

/** Renews the access cookie once, however many calls were refused at the same time. */
export function renewSession(): Promise<boolean> {
  running ??= renew().finally(() => {
    running = null;
  });
  return running;
}

/** Asks for the present token; true where it is another one than before (a sign-in in another tab). */
export async function tokenWasRenewed(): Promise<boolean> {
  const before = csrfToken.get();
  const response = await fetch(endpointUrl(getMe, {}));
  return (await keepToken(response)) && csrfToken.get() !== before;
}
