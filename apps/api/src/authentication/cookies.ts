import type { CookieOptions, Request, Response } from 'express';
import { sessionLimits } from '@leeside/database/sign-in-store';
import { accessTokenRules } from './access-token.js';

const isHttps = (baseUrl: string): boolean => baseUrl.startsWith('https:');
const nameOf = (baseUrl: string, name: 'access' | 'refresh'): string => (isHttps(baseUrl) ? `__Host-${name}` : name);
const optionsOf = (baseUrl: string): CookieOptions => ({ httpOnly: true, sameSite: 'lax', path: '/', secure: isHttps(baseUrl) });
const dayMs = 86_400_000;

/** A cookie of ours; null where there is none. */
export function readCookie(request: Request, baseUrl: string, name: 'access' | 'refresh'): string | null {
  const cookies = request.cookies as Record<string, unknown> | undefined;
  const value = cookies?.[nameOf(baseUrl, name)];
  return typeof value === 'string' ? value : null;
}

export function setSignInCookies(response: Response, baseUrl: string, { access, refresh }: { access: string; refresh: string }): void {
  response.cookie(nameOf(baseUrl, 'access'), access, { ...optionsOf(baseUrl), maxAge: accessTokenRules.lifeSeconds * 1000 });
  response.cookie(nameOf(baseUrl, 'refresh'), refresh, { ...optionsOf(baseUrl), maxAge: sessionLimits.absoluteDays * dayMs });
}

export function clearSignInCookies(response: Response, baseUrl: string): void {
  for (const name of ['access', 'refresh'] as const) response.clearCookie(nameOf(baseUrl, name), optionsOf(baseUrl));
}
