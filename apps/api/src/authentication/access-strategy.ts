import { findPerson } from '@leeside/database/person-store';
import { findSignInSession } from '@leeside/database/sign-in-store';
import type { Request } from 'express';
import { Passport } from 'passport';
import { Strategy, type VerifiedCallback } from 'passport-jwt';
import type { ApiTools } from '../api-tools.js';
import type { Principal } from '../http/principal.js';
import { accessTokenRules, readAccessClaims } from './access-token.js';
import { readCookie } from './cookies.js';

async function principalOf({ db }: ApiTools, payload: unknown): Promise<Principal | null> {
  const claims = readAccessClaims(payload);
  const session = claims === null ? null : await findSignInSession(db, claims.sid);
  if (claims === null || session === null || session.personId !== claims.sub) return null;
  const person = await findPerson(db, claims.sub);
  if (person === null || person.isDisabled) return null;
  return { personId: person.id, labId: person.labId, labName: person.labName, clientId: person.clientId, name: person.name, email: person.email, roles: person.roles, by: { kind: 'cookie', sessionId: session.id } };
}

/** Passport with one strategy: the access token in our cookie, its session asked for in the database at every call. */
export function makePassport(tools: ApiTools): InstanceType<typeof Passport> {
  const passport = new Passport();
  passport.use(new Strategy({
    jwtFromRequest: (request: Request) => readCookie(request, tools.baseUrl, 'access'), secretOrKey: tools.tokenSecret,
    algorithms: [accessTokenRules.algorithm], issuer: accessTokenRules.issuer, audience: accessTokenRules.audience,
  }, (payload: unknown, done: VerifiedCallback) => {
    principalOf(tools, payload).then((principal) => done(null, principal ?? false), (fault: unknown) => done(fault, false));
  }));
  return passport;
}
