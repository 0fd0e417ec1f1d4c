import { randomUUID } from 'node:crypto';
import type { Request, RequestHandler } from 'express';

const ids = new WeakMap<object, string>();

/** The id under which a request is logged and answered. */
export function requestIdOf(request: Pick<Request, 'headers'>): string {
  const id = ids.get(request) ?? randomUUID();
  ids.set(request, id);
  return id;
}

/** Tells the caller the id of the request. */
export const tellRequestId: RequestHandler = (request, response, next) => {
  response.set('X-Request-Id', requestIdOf(request));
  next();
};
