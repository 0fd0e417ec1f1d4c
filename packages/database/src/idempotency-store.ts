import type { Database } from './open-database.js';

export interface KeyedRequest {
  readonly labId: string;
  readonly personId: string;
  readonly key: string;
  readonly requestHash: string;
}

export type KeyedState =
  | { readonly kind: 'first' }
  | { readonly kind: 'under way' }
  | { readonly kind: 'other request' }
  | { readonly kind: 'answered'; readonly status: number; readonly answer: unknown };

const forgetUnfinishedAfter = '2 minutes';

/** Claims a key for a request, or tells what became of it before. */
export async function claimKey(db: Database, request: KeyedRequest): Promise<KeyedState> {
  await db('idempotency_keys').where({ person_id: request.personId, key: request.key })
    .whereRaw(`(created_at < now() - interval '24 hours' or (status is null and created_at < now() - interval '${forgetUnfinishedAfter}'))`).delete();
  const inserted = await db('idempotency_keys').insert({ lab_id: request.labId, person_id: request.personId, key: request.key, request_hash: request.requestHash }).onConflict().ignore().returning('key');
  if (inserted.length === 1) return { kind: 'first' };
  const row: { request_hash: string; status: number | null; answer: unknown } | undefined = await db('idempotency_keys').where({ person_id: request.personId, key: request.key }).first();
  if (!row || row.status === null) return row && row.request_hash !== request.requestHash ? { kind: 'other request' } : { kind: 'under way' };
  return row.request_hash === request.requestHash ? { kind: 'answered', status: row.status, answer: row.answer } : { kind: 'other request' };
}

/** Keeps the answer, in the transaction of the work itself where there is one. */
export async function keepAnswer(db: Database, request: KeyedRequest, status: number, answer: unknown): Promise<void> {
  await db('idempotency_keys').where({ person_id: request.personId, key: request.key }).update({ status, answer: JSON.stringify(answer) });
}

/** Gives a key up whose request failed, so that it may be tried again. */
export async function releaseKey(db: Database, request: KeyedRequest): Promise<void> {
  await db('idempotency_keys').where({ person_id: request.personId, key: request.key }).whereNull('status').delete();
}
