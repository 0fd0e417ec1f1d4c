import { problemSchema } from '@leeside/contracts/problem';
import type { z } from 'zod';
import type { Connection } from './configuration.js';
import { CommandFault } from './exit-code.js';

/** The server could not be reached or is not ready: worth another try. */
export class ServerAway extends Error {}

const tryAgainStatuses = new Set([408, 409, 425, 429, 500, 502, 503, 504]);

/** Calls the API; a fault that may pass is a ServerAway, any other a CommandFault in the server's words. */
export async function callServer(connection: Connection, path: string, request: RequestInit = {}): Promise<Response> {
  const headers = new Headers(request.headers);
  headers.set('Authorization', `Bearer ${connection.token}`);
  const response = await fetch(new URL(`/api/v1${path}`, connection.url), { ...request, headers }).catch((cause: unknown) => {
    throw new ServerAway(`The server at ${connection.url} cannot be reached (${cause instanceof Error ? cause.message : 'no reason given'}).`);
  });
  if (response.ok) return response;
  const problem = problemSchema.safeParse(await response.json().catch(() => null));
  const words = problem.success ? `${problem.data.title}: ${problem.data.detail}` : `HTTP ${response.status}`;
  if (tryAgainStatuses.has(response.status)) throw new ServerAway(words);
  throw new CommandFault(words);
}

/** An answer, checked against its contract. */
export async function askServer<Schema extends z.ZodType>(connection: Connection, path: string, schema: Schema): Promise<z.infer<Schema>> {
  const response = await callServer(connection, path);
  return schema.parse(await response.json());
}

/** Tries again while the server is away, waiting a little longer each time, up to half a minute. */
export async function untilServerAnswers<Answer>(call: () => Promise<Answer>, say: (words: string) => void, pauseMs = 500): Promise<Answer> {
  for (let waitMs = pauseMs; ; waitMs = Math.min(waitMs * 2, 30_000)) {
    try {
      return await call();
    } catch (fault) {
      if (!(fault instanceof ServerAway)) throw fault;
      say(`${fault.message} Trying again in ${(waitMs / 1000).toFixed(1)} s.`);
      await new Promise((resolve) => setTimeout(resolve, waitMs));
    }
  }
}
