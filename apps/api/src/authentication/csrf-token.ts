import { createHmac, timingSafeEqual } from 'node:crypto';
import type { Request } from 'express';
import { HttpProblem } from '../http/http-problem.js';

/** The token that a browser must send with every unsafe call: bound to its session, so that no other session's fits. */
export function csrfTokenOf(sessionId: string, secret: string): string {
  return createHmac('sha256', secret).update(`csrf:${sessionId}`).digest('base64url');
}

const refused = (detail: string): HttpProblem => new HttpProblem(403, 'csrf', 'Not from our own page', detail);

/** Refuses what a browser says comes from elsewhere. */
function checkOrigin(request: Request): void {
  const site = request.get('Sec-Fetch-Site') ?? 'none';
  if (site !== 'same-origin' && site !== 'none') throw refused('The call came from another site.');
  const origin = request.get('Origin');
  if (origin === undefined) return;
  if (!URL.canParse(origin) || new URL(origin).host !== request.get('Host')) throw refused('The call came from another origin.');
}

/** Refuses an unsafe call that did not come from our own page. */
export function checkCsrf(request: Request, sessionId: string, secret: string): void {
  checkOrigin(request);
  const sent = Buffer.from(request.get('X-CSRF-Token') ?? '');
  const wanted = Buffer.from(csrfTokenOf(sessionId, secret));
  if (sent.length !== wanted.length || !timingSafeEqual(sent, wanted)) throw refused('The header X-CSRF-Token is missing or belongs to another session.');
}
