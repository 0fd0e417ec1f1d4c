import type { Endpoint } from '@leeside/contracts/endpoint';
import type { z } from 'zod';

type Part<E, Name extends string, Optional extends boolean> = E extends Record<Name, infer Schema extends z.ZodType>
  ? Optional extends true ? Partial<Record<Name, z.input<Schema>>> : Record<Name, z.input<Schema>>
  : unknown;

/** What a call of this endpoint needs: parameters, query and body as far as it has them. */
export type EndpointInput<E extends Endpoint> = Part<E, 'params', false> & Part<E, 'query', true> & Part<E, 'body', false>;

type Parsed<Schema> = Schema extends z.ZodType ? z.output<Schema> : null;

/** What it answers, over all of its good statuses. */
export type EndpointAnswer<E extends Endpoint> = { [Status in keyof E['answers']]: Parsed<E['answers'][Status]> }[keyof E['answers']];

/** The same, as the code that sends it sees it. */
export interface LooseInput {
  params?: Record<string, string>;
  query?: Record<string, unknown>;
  body?: unknown;
}
