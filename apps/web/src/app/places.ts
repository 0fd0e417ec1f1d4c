import type { User } from '@leeside/contracts/authentication';
import { isAllowed, type Permission } from '@leeside/contracts/permissions';

export interface Place { to: string; word: string; needs: Permission; alsoHolds?: readonly string[] }

const places: readonly Place[] = [
  { to: '/', word: 'Today', needs: 'lab.read' },
  { to: '/sessions', word: 'Sessions', needs: 'lab.read', alsoHolds: ['/curves', '/files'] },
  { to: '/samples', word: 'Samples', needs: 'lab.read' },
  { to: '/requirements', word: 'Requirements', needs: 'lab.read' },
  { to: '/samples', word: 'Your samples', needs: 'own-sample.read' },
  { to: '/tokens', word: 'Tokens', needs: 'token.own' },
];

/** The places on the spine that this person may go to. */
export const placesFor = (user: User): readonly Place[] => places.filter((place) => isAllowed(user.roles, place.needs));

/** Whether a page lies in this place: curves and files are of a session. */
export const isAt = ({ to, alsoHolds = [] }: Place, pathname: string): boolean =>
  to === '/' ? pathname === '/' : [to, ...alsoHolds].some((start) => pathname === start || pathname.startsWith(`${start}/`));
