import type { Role } from '@leeside/contracts/roles';

/** Where to go after signing in: a path of this site that was asked for before, else the person's first page. */
export function placeAfterSignIn(asked: string | null, roles: readonly Role[]): string {
  const isOwnPath = asked !== null && /^\/(?![/\\])/.test(asked);
  if (isOwnPath) return asked;
  return roles.includes('client') ? '/samples' : '/';
}
