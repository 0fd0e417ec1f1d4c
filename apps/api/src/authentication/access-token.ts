import jwt from 'jsonwebtoken';
import { z } from 'zod';

export const accessTokenRules = { algorithm: 'HS256', issuer: 'leeside', audience: 'leeside-api', purpose: 'access', lifeSeconds: 600 } as const;

const claimsSchema = z.object({ sub: z.uuid(), sid: z.uuid(), purpose: z.literal(accessTokenRules.purpose), exp: z.number() });
export type AccessClaims = z.infer<typeof claimsSchema>;

/** A token of ten minutes for a session of a person. */
export function makeAccessToken({ personId, sessionId }: { personId: string; sessionId: string }, secret: string): string {
  return jwt.sign({ sid: sessionId, purpose: accessTokenRules.purpose }, secret, {
    algorithm: accessTokenRules.algorithm, issuer: accessTokenRules.issuer, audience: accessTokenRules.audience, expiresIn: accessTokenRules.lifeSeconds, subject: personId,
  });
}

/** The claims of a token whose signature has been checked; null where they are not those of an access token. */
export function readAccessClaims(payload: unknown): AccessClaims | null {
  const claims = claimsSchema.safeParse(payload);
  return claims.success ? claims.data : null;
}
