import type { z } from 'zod';
import type { Permission } from './permissions.js';

/** Who may call: anybody, anybody signed in, or whoever holds a permission. */
export type Access = 'public' | 'signed in' | Permission | readonly Permission[];

/**
 * One call of the API: what the router mounts, the client parses and the OpenAPI document lists.
 * `path` is relative to `/api/v1`, parameters in braces; a response schema of null is an answer that is not JSON.
 */
export interface Endpoint {
  readonly name: string;
  readonly method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  readonly path: string;
  readonly summary: string;
  readonly access: Access;
  readonly params?: z.ZodType;
  readonly query?: z.ZodType;
  readonly body?: z.ZodType;
  readonly multipart?: true;
  readonly answers: Readonly<Record<number, z.ZodType | null>>;
  readonly answerType?: string;
}

/**
 * Keeps the exact types of a definition while checking its form.
 * @param definition the call.
 * @example endpoint({ name: 'signOut', method: 'post', path: '/auth/sign-out', summary: 'End this session', access: 'signed in', answers: { 204: null } })
 */
export function endpoint<const Definition extends Endpoint>(definition: Definition): Definition {
  return definition;
}
