import { problemSchema, type ProblemBody } from '@leeside/contracts/problem';

export interface FieldProblem { pointer: string; code: string; message: string }

/** An answer that is no success, in words that can be shown. Status 0: nothing came back at all. */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';
  readonly errors: readonly FieldProblem[];
  readonly requestId: string | null;
  constructor(
    readonly status: number,
    readonly title: string,
    readonly detail: string,
    { errors = [], requestId = null }: { errors?: readonly FieldProblem[]; requestId?: string | null } = {},
  ) {
    super(detail || title);
    this.errors = errors;
    this.requestId = requestId;
  }
}

const wordsForStatus: Readonly<Record<number, string>> = {
  401: 'You are not signed in any more.',
  403: 'Your role does not allow this.',
  404: 'There is nothing here, or it is not yours to see.',
  413: 'A proxy on the way refused the upload as too large.',
  429: 'Too many requests for the moment. Wait a little and try again.',
  502: 'The server behind the proxy does not answer.',
  503: 'The server is not ready.',
  504: 'The server took too long to answer.',
};

const fromBody = (body: ProblemBody): ApiProblem =>
  new ApiProblem(body.status, body.title, body.detail, { errors: body.errors ?? [], requestId: body.requestId });

/** Turns any failed answer into a problem; a proxy's HTML page is told by its status alone. */
export function problemFrom(status: number, text: string): ApiProblem {
  try {
    const parsed = problemSchema.safeParse(JSON.parse(text));
    if (parsed.success) return fromBody(parsed.data);
  } catch {
    // Not JSON: the words for the status have to do.
  }
  const words = wordsForStatus[status] ?? `The server answered with status ${String(status)}.`;
  return new ApiProblem(status, 'The request did not succeed', words);
}

export const nothingCameBack = (): ApiProblem =>
  new ApiProblem(0, 'No connection', 'The server could not be reached. Nothing was changed; try again when the network is back.');

/** What an unknown failure is called on the page. */
export function problemOf(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error;
  return new ApiProblem(0, 'Something went wrong here', error instanceof Error ? error.message : String(error));
}
