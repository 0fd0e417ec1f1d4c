/** A refusal in words: becomes an RFC 9457 answer. Anything else that is thrown is a fault of ours and answers 500. */
export class HttpProblem extends Error {
  readonly status: number;
  readonly slug: string;
  readonly title: string;
  readonly more: ProblemExtras;

  constructor(...[status, slug, title, detail, more = {}]: [status: number, slug: string, title: string, detail: string, more?: ProblemExtras]) {
    super(detail);
    this.status = status;
    this.slug = slug;
    this.title = title;
    this.more = more;
  }
}

/** Places in the request that were wrong, and headers that go with the answer. */
export interface ProblemExtras {
  readonly errors?: readonly { pointer: string; code: string; message: string }[];
  readonly headers?: Readonly<Record<string, string>>;
}

export const notFound = (what = 'There is nothing at this address.'): HttpProblem => new HttpProblem(404, 'not-found', 'Not found', what);
export const forbidden = (detail: string): HttpProblem => new HttpProblem(403, 'forbidden', 'Not allowed', detail);
export const notSignedIn = (): HttpProblem => new HttpProblem(401, 'not-signed-in', 'Not signed in', 'Sign in, or send a valid API token.');
export const badRequest = (slug: string, detail: string): HttpProblem => new HttpProblem(400, slug, 'The request cannot be understood', detail);
export const conflict = (slug: string, detail: string): HttpProblem => new HttpProblem(409, slug, 'This is in conflict with what is there', detail);

/** A value of the body that names something the lab does not have. */
export function unknownReference(pointer: string, what: string): HttpProblem {
  return new HttpProblem(422, 'unknown-reference', 'Something named does not exist', `There is no such ${what}.`, { errors: [{ pointer, code: 'unknown', message: `There is no such ${what}.` }] });
}
