import { z } from 'zod';
import { endpoint } from './endpoint.js';
import { idParamsSchema, idSchema, listOf, shortTextSchema, timeSchema } from './field-schemas.js';
import { roleSchema } from './roles.js';

export const userSchema = z.object({
  id: idSchema, name: z.string(), email: z.string(), roles: z.array(roleSchema),
  clientId: idSchema.nullable(), labName: z.string(),
});
export type User = z.infer<typeof userSchema>;

export const signedInSchema = z.object({ user: userSchema, csrfToken: z.string() });

export const signIn = endpoint({
  name: 'signIn', method: 'post', path: '/auth/sign-in', summary: 'Sign in with e-mail and password', access: 'public',
  body: z.strictObject({ email: z.string().max(320), password: z.string().max(1024) }),
  answers: { 200: signedInSchema },
});
export const refreshSession = endpoint({
  name: 'refreshSession', method: 'post', path: '/auth/refresh', summary: 'Renew the access cookie by the refresh cookie', access: 'public',
  answers: { 200: signedInSchema },
});
export const signOut = endpoint({
  name: 'signOut', method: 'post', path: '/auth/sign-out', summary: 'End this session', access: 'signed in', answers: { 204: null },
});
export const getMe = endpoint({
  name: 'getMe', method: 'get', path: '/auth/me', summary: 'Who is signed in', access: 'signed in', answers: { 200: signedInSchema },
});
/** Only while the lab has no admin; the token comes from the one-time link that `start --empty` prints. */
export const createFirstAdmin = endpoint({
  name: 'createFirstAdmin', method: 'post', path: '/auth/first-admin', summary: 'Become the first admin of an empty lab', access: 'public',
  body: z.strictObject({
    token: z.string().min(1).max(400), name: shortTextSchema, email: z.email().max(320), password: z.string().min(12).max(1024),
  }),
  answers: { 201: signedInSchema },
});

export const tokenScopeSchema = z.enum(['read', 'write']);
export const createToken = endpoint({
  name: 'createToken', method: 'post', path: '/auth/tokens', summary: 'Make an API token of one’s own', access: 'token.own',
  body: z.strictObject({ name: shortTextSchema, scopes: z.array(tokenScopeSchema).min(1).optional() }),
  answers: { 201: z.object({ id: idSchema, token: z.string() }) },
});
export const listTokens = endpoint({
  name: 'listTokens', method: 'get', path: '/auth/tokens', summary: 'One’s own API tokens', access: 'token.own',
  answers: {
    200: listOf(z.object({
      id: idSchema, name: z.string(), scopes: z.array(tokenScopeSchema), createdAt: timeSchema,
      lastUsedAt: timeSchema.nullable(),
    })),
  },
});
export const revokeToken = endpoint({
  name: 'revokeToken', method: 'delete', path: '/auth/tokens/{id}', summary: 'Revoke an API token of one’s own', access: 'token.own',
  params: idParamsSchema, answers: { 204: null },
});
