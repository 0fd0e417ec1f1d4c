import { createHash } from 'node:crypto';
import { claimKey, keepAnswer, releaseKey, type KeyedRequest } from '@leeside/database/idempotency-store';
import type { Database } from '@leeside/database/open-database';
import type { Request } from 'express';
import type { Answer } from './answer.js';
import { badRequest, conflict, HttpProblem } from './http-problem.js';
import type { Principal } from './principal.js';

const longestKey = 200;

/**
 * Answers a request that carries an `Idempotency-Key` once: sent again, it gets the first answer; with another payload 422, while the first
 * is under way 409. Given a transaction, key, work and answer are kept together or not at all: a crash leaves the key free.
 */
export async function answerOnce(db: Database, { principal, request, payload }: { principal: Principal; request: Request; payload: unknown }, work: () => Promise<Answer | undefined>): Promise<Answer | undefined> {
  const key = request.get('Idempotency-Key');
  if (key === undefined) return work();
  if (key === '' || key.length > longestKey) throw badRequest('invalid-request', `An Idempotency-Key has 1 to ${longestKey} characters.`);
  const requestHash = createHash('sha256').update(JSON.stringify([request.method, request.originalUrl, payload])).digest('hex');
  const keyed: KeyedRequest = { labId: principal.labId, personId: principal.personId, key, requestHash };
  const state = await claimKey(db, keyed);
  if (state.kind === 'answered') return { status: state.status, body: state.answer };
  if (state.kind === 'under way') throw conflict('request-under-way', 'A request with this Idempotency-Key is still under way.');
  if (state.kind === 'other request') throw new HttpProblem(422, 'key-used', 'This key belongs to another request', 'The Idempotency-Key was used with another request before.');
  try {
    const answer = await work();
    if (answer !== undefined) await keepAnswer(db, keyed, answer.status, answer.body ?? null);
    return answer;
  } catch (fault) {
    await releaseKey(db, keyed).catch(() => undefined);
    throw fault;
  }
}
