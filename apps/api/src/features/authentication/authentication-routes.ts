import { createFirstAdmin, createToken, getMe, listTokens, refreshSession, revokeToken, signIn, signOut } from '@leeside/contracts/authentication';
import { createApiToken, listApiTokens, revokeApiToken } from '@leeside/database/api-token-store';
import { recordAudit } from '@leeside/database/audit-store';
import { useFirstAdminLink } from '@leeside/database/lab-store';
import { inTransaction } from '@leeside/database/open-database';
import { createPerson, findPerson, findPersonByEmail, type Person } from '@leeside/database/person-store';
import { createSignInSession, endSignInSession, rotateRefreshToken } from '@leeside/database/sign-in-store';
import type { Response, Router } from 'express';
import type { ApiTools } from '../../api-tools.js';
import { makeAccessToken } from '../../authentication/access-token.js';
import { makeApiToken } from '../../authentication/api-token.js';
import { clearSignInCookies, readCookie, setSignInCookies } from '../../authentication/cookies.js';
import { csrfTokenOf } from '../../authentication/csrf-token.js';
import { hashPassword, passwordFits } from '../../authentication/passwords.js';
import { hashToken, randomToken } from '../../authentication/random-token.js';
import { openSealedToken, sealToken } from '../../authentication/sealed-token.js';
import { countFailedTry, forgiveTries, refuseTooManyTries } from '../../authentication/sign-in-limits.js';
import { HttpProblem, notFound, notSignedIn } from '../../http/http-problem.js';
import type { Answer } from '../../http/answer.js';
import { mountEndpoint } from '../../http/mount-endpoint.js';

type Identity = Pick<Person, 'id' | 'name' | 'email' | 'roles' | 'clientId' | 'labName'>;

function signedIn(tools: ApiTools, person: Identity, sessionId: string): Answer {
  const { id, name, email, roles, clientId, labName } = person;
  return { status: 200, body: { user: { id, name, email, roles, clientId, labName }, csrfToken: csrfTokenOf(sessionId, tools.tokenSecret) } };
}

async function openSession(tools: ApiTools, response: Response, person: Person): Promise<Answer> {
  const refresh = randomToken();
  const sessionId = await inTransaction(tools.db, async (trx) => {
    const id = await createSignInSession(trx, { labId: person.labId, personId: person.id, refreshHash: hashToken(refresh) });
    await recordAudit(trx, { labId: person.labId, personId: person.id, action: 'sign-in', subjectKind: 'person', subjectId: person.id });
    return id;
  });
  setSignInCookies(response, tools.baseUrl, { access: makeAccessToken({ personId: person.id, sessionId }, tools.tokenSecret), refresh });
  return signedIn(tools, person, sessionId);
}

async function refresh(tools: ApiTools, token: string | null, response: Response): Promise<Answer> {
  if (token === null) throw notSignedIn();
  const next = randomToken();
  const rotation = await rotateRefreshToken(tools.db, { refreshHash: hashToken(token), nextHash: hashToken(next), sealedNext: sealToken(next, tools.tokenSecret) });
  if (rotation.kind === 'reused') {
    await inTransaction(tools.db, (trx) => recordAudit(trx, { labId: rotation.session.labId, personId: rotation.session.personId, action: 'refresh-token-reused', subjectKind: 'sign-in session', subjectId: rotation.session.id }));
  }
  const person = rotation.kind === 'rotated' || rotation.kind === 'again' ? await findPerson(tools.db, rotation.session.personId) : null;
  if (person === null || person.isDisabled || rotation.kind === 'reused' || rotation.kind === 'unknown') {
    clearSignInCookies(response, tools.baseUrl);
    throw notSignedIn();
  }
  const { session } = rotation;
  const successor = rotation.kind === 'again' ? openSealedToken(rotation.sealedSuccessor, tools.tokenSecret) : next;
  setSignInCookies(response, tools.baseUrl, { access: makeAccessToken({ personId: person.id, sessionId: session.id }, tools.tokenSecret), refresh: successor });
  return signedIn(tools, person, session.id);
}

export function mountAuthentication(router: Router, tools: ApiTools): void {
  mountEndpoint(router, tools, signIn, async ({ body, request, response }) => {
    const address = request.ip ?? '';
    await refuseTooManyTries(tools, body.email, address);
    const person = await findPersonByEmail(tools.db, body.email);
    if (!(await passwordFits(body.password, person?.passwordHash ?? null)) || person === null || person.isDisabled) {
      await countFailedTry(tools, body.email, address);
      throw new HttpProblem(401, 'wrong-credentials', 'Not signed in', 'E-mail address or password are not right.');
    }
    await forgiveTries(tools, body.email, address);
    return openSession(tools, response, person);
  });
  mountEndpoint(router, tools, refreshSession, ({ request, response }) => refresh(tools, readCookie(request, tools.baseUrl, 'refresh'), response));
  mountEndpoint(router, tools, signOut, async ({ principal, response }) => {
    if (principal.by.kind === 'cookie') await endSignInSession(tools.db, principal.by.sessionId);
    clearSignInCookies(response, tools.baseUrl);
    return { status: 204 };
  });
  mountEndpoint(router, tools, getMe, ({ principal }) => Promise.resolve(signedIn(tools, { ...principal, id: principal.personId, roles: [...principal.roles] }, principal.by.kind === 'cookie' ? principal.by.sessionId : principal.personId)));
  mountEndpoint(router, tools, createFirstAdmin, async ({ body, response }) => {
    const passwordHash = await hashPassword(body.password);
    const personId = await inTransaction(tools.db, async (trx) => {
      const labId = await useFirstAdminLink(trx, hashToken(body.token));
      if (labId === null) throw new HttpProblem(410, 'link-used', 'The link no longer works', 'The link was used already or is not known. Start again with --empty for a new one.');
      const id = await createPerson(trx, { labId, name: body.name, email: body.email, passwordHash, roles: ['admin', 'engineer', 'analyst'] });
      await recordAudit(trx, { labId, personId: id, action: 'first-admin', subjectKind: 'person', subjectId: id });
      return id;
    });
    const person = await findPerson(tools.db, personId);
    if (person === null) throw notFound();
    return { ...(await openSession(tools, response, person)), status: 201 };
  });
}

export function mountTokens(router: Router, tools: ApiTools): void {
  mountEndpoint(router, tools, createToken, async ({ body, principal }) => {
    const token = makeApiToken();
    const { labId, personId } = principal;
    const scopes = [...new Set(body.scopes ?? (['read', 'write'] as const))];
    const id = await inTransaction(tools.db, async (trx) => {
      const made = await createApiToken(trx, { labId, personId, name: body.name, tokenHash: hashToken(token), scopes });
      await recordAudit(trx, { labId, personId, action: 'token-made', subjectKind: 'api token', subjectId: made, details: { name: body.name, scopes } });
      return made;
    });
    return { status: 201, body: { id, token } };
  });
  mountEndpoint(router, tools, listTokens, async ({ principal }) => ({ status: 200, body: { items: await listApiTokens(tools.db, principal.personId) } }));
  mountEndpoint(router, tools, revokeToken, async ({ params, principal }) => {
    const { labId, personId } = principal;
    await inTransaction(tools.db, async (trx) => {
      if (!(await revokeApiToken(trx, personId, params.id))) throw notFound();
      await recordAudit(trx, { labId, personId, action: 'token-revoked', subjectKind: 'api token', subjectId: params.id });
    });
    return { status: 204 };
  });
}
