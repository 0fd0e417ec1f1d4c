import { HttpProblem } from '../http/http-problem.js';
import type { ApiTools } from '../api-tools.js';

export const signInLimits = { perAccountAndAddress: 10, perAddress: 100, windowMs: 15 * 60_000 } as const;

/** Only failures count, per account and address: strangers cannot lock somebody out from elsewhere. */
const accountKey = (email: string, address: string): string => `${email.trim().toLowerCase()}|${address}`;

export async function refuseTooManyTries({ limits }: ApiTools, email: string, address: string): Promise<void> {
  const [byAccount, byAddress] = await Promise.all([limits.signInByAccount.read(accountKey(email, address)), limits.signInByAddress.read(address)]);
  if (byAccount < signInLimits.perAccountAndAddress && byAddress < signInLimits.perAddress) return;
  throw new HttpProblem(429, 'too-many-tries', 'Too many tries', 'Too many sign-ins failed. Wait a quarter of an hour and try again.', { headers: { 'Retry-After': String(signInLimits.windowMs / 1000) } });
}

export async function countFailedTry({ limits }: ApiTools, email: string, address: string): Promise<void> {
  await Promise.all([limits.signInByAccount.add(accountKey(email, address)), limits.signInByAddress.add(address)]);
}

export async function forgiveTries({ limits }: ApiTools, email: string, address: string): Promise<void> {
  await limits.signInByAccount.clear(accountKey(email, address));
}
