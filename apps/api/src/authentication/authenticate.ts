import { findApiToken } from '@leeside/database/api-token-store';
import { findPerson } from '@leeside/database/person-store';
import type { Request } from 'express';
import type { Passport } from 'passport';
import type { ApiTools } from '../api-tools.js';
import type { Principal } from '../http/principal.js';
import { makePassport } from './access-strategy.js';
import { looksLikeApiToken } from './api-token.js';
import { hashToken } from './random-token.js';

const passports = new WeakMap<ApiTools, InstanceType<typeof Passport>>();

function passportOf(tools: ApiTools): InstanceType<typeof Passport> {
  const passport = passports.get(tools) ?? makePassport(tools);
  passports.set(tools, passport);
  return passport;
}

const asError = (fault: unknown): Error => (fault instanceof Error ? fault : new Error('Authentication broke.'));

function byCookie(tools: ApiTools, request: Request): Promise<Principal | null> {
  return new Promise((resolve, reject) => {
    const passport = passportOf(tools);
    const middleware: unknown = passport.authenticate('jwt', { session: false }, (fault: unknown, principal: Principal | false) => {
      if (fault) reject(asError(fault));
      else resolve(principal === false ? null : principal);
    });
    (middleware as (request: Request, response: unknown, next: (fault?: unknown) => void) => void)(request, {}, (fault) => (fault ? reject(asError(fault)) : resolve(null)));
  });
}

async function byToken({ db }: ApiTools, text: string): Promise<Principal | null> {
  if (!looksLikeApiToken(text)) return null;
  const token = await findApiToken(db, hashToken(text));
  const person = token === null ? null : await findPerson(db, token.personId);
  if (token === null || person === null || person.isDisabled) return null;
  return { personId: person.id, labId: person.labId, labName: person.labName, clientId: person.clientId, name: person.name, email: person.email, roles: person.roles, by: { kind: 'token', scopes: token.scopes } };
}

/** Who calls: by bearer token where one is sent, else by our cookie; null is nobody. */
export function authenticate(tools: ApiTools, request: Request): Promise<Principal | null> {
  const header = request.get('Authorization');
  if (header === undefined) return byCookie(tools, request);
  return byToken(tools, /^Bearer (\S+)$/i.exec(header)?.[1] ?? '');
}
