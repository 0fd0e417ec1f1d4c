import type { Endpoint } from '@leeside/contracts/endpoint';
import { isAllowed, type Permission } from '@leeside/contracts/permissions';
import type { NextFunction, Request, Response, Router } from 'express';
import type { z } from 'zod';
import type { ApiTools } from '../api-tools.js';
import { authenticate } from '../authentication/authenticate.js';
import { checkCsrf } from '../authentication/csrf-token.js';
import { problemOfZod } from './answer-problems.js';
import { badRequest, forbidden, HttpProblem, notFound, notSignedIn } from './http-problem.js';
import type { Answer } from './answer.js';
import { answerOnce } from './idempotency.js';
import type { Principal } from './principal.js';

type Parsed<Schema> = Schema extends z.ZodType ? z.infer<Schema> : undefined;
type PrincipalOf<Definition extends Endpoint> = Definition['access'] extends 'public' ? Principal | null : Principal;

/** One call, checked: what the handler gets. */
export interface Call<Definition extends Endpoint> {
  readonly params: Parsed<Definition['params']>;
  readonly query: Parsed<Definition['query']>;
  readonly body: Parsed<Definition['body']>;
  readonly principal: PrincipalOf<Definition>;
  readonly request: Request;
  readonly response: Response;
}

export type Handler<Definition extends Endpoint> = (call: Call<Definition>) => Promise<Answer | undefined>;

const isSafe = (method: string): boolean => method === 'GET' || method === 'HEAD';

/** An unsafe call needs the token of its session, or a program's right to write; a safe one the right to read. */
function checkManner(principal: Principal, request: Request, secret: string): void {
  if (principal.by.kind === 'cookie') {
    if (!isSafe(request.method)) checkCsrf(request, principal.by.sessionId, secret);
    return;
  }
  const wanted = isSafe(request.method) ? 'read' : 'write';
  if (!principal.by.scopes.includes(wanted)) throw forbidden(`This API token may not ${wanted}.`);
}

function checkAccess(access: Endpoint['access'], principal: Principal | null, request: Request, secret: string): void {
  if (access === 'public') return;
  if (principal === null) throw notSignedIn();
  checkManner(principal, request, secret);
  if (access === 'signed in') return;
  const wanted: readonly Permission[] = typeof access === 'string' ? [access] : access;
  if (!wanted.some((permission) => isAllowed(principal.roles, permission))) throw forbidden('Your roles do not allow this.');
}

function parse(schema: z.ZodType | undefined, value: unknown, where: 'params' | 'query' | 'body'): unknown {
  if (schema === undefined) {
    if (where === 'query' && typeof value === 'object' && value !== null && Object.keys(value).length > 0) throw badRequest('unknown-parameter', `There is no parameter "${Object.keys(value)[0]}".`);
    return undefined;
  }
  const parsed = schema.safeParse(value ?? {});
  if (parsed.success) return parsed.data;
  throw where === 'params' ? notFound() : problemOfZod(parsed.error, where);
}

function requireJson(endpoint: Endpoint, request: Request): void {
  if (endpoint.body === undefined || endpoint.multipart) return;
  if (request.is('application/json') === false) throw new HttpProblem(415, 'unsupported-media-type', 'Unsupported media type', 'Send the body as application/json.');
}

/**
 * Mounts one call of the contract: who calls, may they, is the request as it should be, then the handler.
 * @param router router of `/api/v1`.
 * @param tools what handlers use.
 * @param endpoint the call's definition.
 * @param handle what it does.
 */
export function mountEndpoint<Definition extends Endpoint>(router: Router, tools: ApiTools, endpoint: Definition, handle: Handler<Definition>): void {
  const path = endpoint.path.replaceAll(/\{(\w+)\}/g, ':$1');
  router[endpoint.method](path, async (request: Request, response: Response, next: NextFunction) => {
    try {
      const principal = await authenticate(tools, request);
      checkAccess(endpoint.access, principal, request, tools.tokenSecret);
      requireJson(endpoint, request);
      const call = {
        params: parse(endpoint.params, request.params, 'params'), query: parse(endpoint.query, request.query, 'query'), body: parse(endpoint.body, request.body, 'body'), principal, request, response,
      } as unknown as Call<Definition>;
      const isKeyed = endpoint.method === 'post' && !endpoint.multipart && principal !== null;
      const answer = isKeyed ? await answerOnce(tools.db, { principal, request, payload: call.body }, () => handle(call)) : await handle(call);
      if (answer !== undefined) sendAnswer(response, answer);
    } catch (fault) {
      next(fault);
    }
  });
}

function sendAnswer(response: Response, { status, body, headers }: Answer): void {
  response.status(status).set('Cache-Control', 'no-store').set(headers ?? {});
  if (body === undefined) response.end();
  else response.json(body);
}
