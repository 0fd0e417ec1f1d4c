import { signedInSchema } from '@leeside/contracts/authentication';
import { problemSchema } from '@leeside/contracts/problem';
import type { z } from 'zod';

/** A browser's part of the API, as much as the demo needs: cookies and the token that unsafe calls carry. */
export interface DemoClient {
  ask<Schema extends z.ZodType>(path: string, schema: Schema): Promise<z.infer<Schema>>;
  send<Schema extends z.ZodType>(path: string, body: FormData | object, schema: Schema): Promise<z.infer<Schema>>;
}

async function answerOf<Schema extends z.ZodType>(response: Response, schema: Schema): Promise<z.infer<Schema>> {
  const body: unknown = await response.json();
  const problem = response.ok ? null : problemSchema.safeParse(body);
  if (problem !== null) throw new Error(problem.success ? `${problem.data.title}: ${problem.data.detail}` : `HTTP ${response.status}`);
  return schema.parse(body);
}

export async function signInDemo(origin: string, email: string, password: string): Promise<DemoClient> {
  const base = `${origin}/api/v1`;
  const json = { 'Content-Type': 'application/json' };
  const signed = await fetch(`${base}/auth/sign-in`, { method: 'POST', headers: json, body: JSON.stringify({ email, password }) });
  const { csrfToken } = await answerOf(signed, signedInSchema);
  const headers = { Cookie: signed.headers.getSetCookie().map((cookie) => cookie.split(';')[0]).join('; '), 'X-CSRF-Token': csrfToken };
  return {
    ask: async (path, schema) => answerOf(await fetch(base + path, { headers }), schema),
    send: async (path, body, schema) => {
      const isForm = body instanceof FormData;
      return answerOf(await fetch(base + path, { method: 'POST', headers: isForm ? headers : { ...headers, ...json }, body: isForm ? body : JSON.stringify(body) }), schema);
    },
  };
}
