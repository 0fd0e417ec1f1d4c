import type { User } from '@leeside/contracts/authentication';
import { isAllowed, type Permission } from '@leeside/contracts/permissions';
import { createContext, use } from 'react';

export const SignedInContext = createContext<User | null>(null);

/** Who is signed in; only inside the gate. */
export function useSignedIn(): User {
  const user = use(SignedInContext);
  if (!user) throw new Error('This part of the page is for people who are signed in.');
  return user;
}

/** Whether the person may do something; what they may not do is not shown. */
export function useMay(permission: Permission): boolean {
  return isAllowed(useSignedIn().roles, permission);
}
