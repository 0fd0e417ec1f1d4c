import { setTimeout as sleep } from 'node:timers/promises';
import { problemSchema } from '@leeside/contracts/problem';
import type { z } from 'zod';
import type { Connection } from './configuration.js';
import { CommandFault, Interrupted } from './exit-code.js';
import { benchPace, type Pace } from './pace.js';

/** The server could not be reached or is not ready: worth another try. */
export class ServerAway extends Error {}

/** A server, and how long we put up with it. */
export interface ServerLine extends Connection {
  readonly pace?: Pace;
  /** Ends every call and every pause at once. */
  readonly leaving?: AbortSignal;
}

const passingStatuses = new Set([408, 425, 429, 500, 502, 503, 504]);
/** Faults of other statuses that pass as well: the same request is under way still, or its bytes were cut off on the way. */
const passingProblems = /\/(request-under-way|upload-incomplete)$/;
const wordsOf = (cause: unknown): string => {
  const innermost = cause instanceof Error && cause.cause instanceof Error ? cause.cause : cause;
  return innermost instanceof Error ? innermost.message : 'no reason given';
};

/**
 * Runs a call that ends when we leave or when it has taken too long. The bound is needed for every call: where the
 * server ends between accepting a connection and the first byte, `fetch` of Node.js 20 settles never.
 */
async function endingInTime<Answer>(line: ServerLine, withinMs: number, call: (signal: AbortSignal) => Promise<Answer>): Promise<Answer> {
  const ending = new AbortController();
  const leave = (): void => ending.abort(new Interrupted());
  if (line.leaving?.aborted) leave();
  line.leaving?.addEventListener('abort', leave);
  const timer = setTimeout(() => ending.abort(new Error(`no answer within ${withinMs / 1000} s`)), withinMs);
  try {
    return await call(ending.signal);
  } catch (cause) {
    if (line.leaving?.aborted) throw new Interrupted();
    throw new ServerAway(`The server at ${line.url} cannot be reached (${wordsOf(cause)}).`);
  } finally {
    clearTimeout(timer);
    line.leaving?.removeEventListener('abort', leave);
  }
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

interface Call extends Pick<RequestInit, 'method' | 'body' | 'headers'> {
  /** How many bytes are sent: they take their time. */
  readonly byteCount?: number;
}

/** Calls the API and gives the text of the answer; a fault that may pass is a ServerAway, any other a CommandFault in the server's words. */
export async function callServer(line: ServerLine, path: string, { byteCount = 0, ...request }: Call = {}): Promise<string> {
  const headers = new Headers(request.headers);
  headers.set('Authorization', `Bearer ${line.token}`);
  const { answerWithinMs, slowestBytesPerSecond } = line.pace ?? benchPace;
  const withinMs = answerWithinMs + (byteCount / slowestBytesPerSecond) * 1000;
  const { status, isGood, text } = await endingInTime(line, withinMs, async (signal) => {
    const response = await fetch(new URL(`/api/v1${path}`, line.url), { ...request, headers, signal });
    return { status: response.status, isGood: response.ok, text: await response.text() };
  });
  if (isGood) return text;
  const problem = problemSchema.safeParse(jsonOf(text));
  const words = problem.success ? `${problem.data.title}: ${problem.data.detail}` : `The server answered with HTTP ${status}.`;
  if (passingStatuses.has(status) || passingProblems.test(problem.data?.type ?? '')) throw new ServerAway(words);
  throw new CommandFault(words);
}

/** An answer read by its contract. What is not JSON comes from something that stands before the server, and may pass. */
export function readAnswer<Schema extends z.ZodType>(line: ServerLine, text: string, schema: Schema): z.infer<Schema> {
  const body = jsonOf(text);
  if (body === undefined) throw new ServerAway(`What answers at ${line.url} is not a Leeside server.`);
  const answer = schema.safeParse(body);
  if (!answer.success) throw new CommandFault(`The server at ${line.url} answers otherwise than this command expects: they are of different versions.`);
  return answer.data;
}

/** An answer, checked against its contract. */
export async function askServer<Schema extends z.ZodType>(line: ServerLine, path: string, schema: Schema): Promise<z.infer<Schema>> {
  return readAnswer(line, await callServer(line, path), schema);
}

/** Waits, unless we leave. */
export async function pause(line: ServerLine, waitMs: number): Promise<void> {
  await sleep(waitMs, undefined, line.leaving ? { signal: line.leaving } : {}).catch(() => {
    throw new Interrupted();
  });
}

/** Tries again while the server is away, waiting a little longer each time. */
export async function untilServerAnswers<Answer>(line: ServerLine, say: (words: string) => void, call: () => Promise<Answer>): Promise<Answer> {
  const { firstPauseMs, longestPauseMs } = line.pace ?? benchPace;
  for (let waitMs = firstPauseMs; ; waitMs = Math.min(waitMs * 2, longestPauseMs)) {
    try {
      return await call();
    } catch (fault) {
      if (!(fault instanceof ServerAway)) throw fault;
      say(`${fault.message} Trying again in ${(waitMs / 1000).toFixed(1)} s.`);
      await pause(line, waitMs);
    }
  }
}
