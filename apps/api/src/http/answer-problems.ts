import type { ErrorRequestHandler, Request, RequestHandler, Response } from 'express';
import type { z } from 'zod';
import type { ApiTools } from '../api-tools.js';
import { HttpProblem, notFound } from './http-problem.js';
import { requestIdOf } from './request-id.js';

/** Sends a refusal as problem+json. */
function sendProblem(request: Request, response: Response, problem: HttpProblem): void {
  response.status(problem.status).set(problem.more.headers ?? {}).type('application/problem+json').send(JSON.stringify({
    type: `/problems/${problem.slug}`, title: problem.title, status: problem.status, detail: problem.message, instance: request.originalUrl.split('?')[0],
    requestId: requestIdOf(request), ...(problem.more.errors === undefined ? {} : { errors: problem.more.errors }),
  }));
}

const pointerOf = (path: readonly PropertyKey[]): string => `/${path.map((part) => String(part).replaceAll('~', '~0').replaceAll('/', '~1')).join('/')}`;

/** What zod found wrong, place by place. */
export function problemOfZod(fault: z.ZodError, where: 'body' | 'query'): HttpProblem {
  const errors = fault.issues.slice(0, 50).map((issue) => ({ pointer: where === 'body' ? pointerOf(issue.path) : `?${issue.path.join('.')}`, code: issue.code, message: issue.message }));
  const first = errors[0];
  return new HttpProblem(400, 'invalid-request', 'The request is not as it should be', first ? `${first.pointer}: ${first.message}` : 'The request is not as it should be.', { errors });
}

const isConnectionFault = (fault: Error): boolean => /ECONNREFUSED|ECONNRESET|Timeout acquiring a connection|timeout exceeded when trying to connect|Connection terminated|Client has encountered a connection error|the database system is (starting up|shutting down|in recovery)|terminating connection/i.test(`${fault.message} ${'code' in fault ? String(fault.code) : ''}`);

const badBody = (status: number): HttpProblem => new HttpProblem(status, 'invalid-request', 'The request is not as it should be', 'The request could not be read.');

/** What the body parsers throw, by their own names. */
function problemOfParser(fault: Error): HttpProblem | null {
  const { type, status } = fault as { type?: unknown; status?: unknown };
  if (type === 'entity.parse.failed') return new HttpProblem(400, 'malformed-json', 'The body is not JSON', 'The body could not be read as JSON.');
  if (type === 'entity.too.large') return new HttpProblem(413, 'too-large', 'Too large', 'The body is larger than 2 MiB.');
  return typeof type === 'string' && typeof status === 'number' && status < 500 ? badBody(status) : null;
}

function problemOf(fault: unknown): HttpProblem | null {
  if (fault instanceof HttpProblem) return fault;
  if (!(fault instanceof Error)) return null;
  if (fault instanceof URIError) return badBody(400);
  if (isConnectionFault(fault)) return new HttpProblem(503, 'not-ready', 'Not ready', 'The database cannot be reached for the moment. Nothing was changed; try again.', { headers: { 'Retry-After': '2' } });
  return problemOfParser(fault);
}

/** The last handler: a refusal in words, or 500 without a word of what broke. */
export function answerProblems(tools: Pick<ApiTools, 'log'>): ErrorRequestHandler {
  return (fault: unknown, request, response, _next) => {
    const problem = problemOf(fault);
    if (problem === null) tools.log.error({ fault, requestId: requestIdOf(request) }, 'request failed');
    if (response.headersSent) {
      response.destroy();
      return;
    }
    sendProblem(request, response, problem ?? new HttpProblem(500, 'internal', 'Something broke', 'This is a fault of Leeside. It was written down under the request’s id.'));
  };
}

/** Whatever no route took. */
export const answerUnknownRoute: RequestHandler = () => {
  throw notFound();
};
