import type { Database } from './open-database.js';

/** A signed-in browser. */
export interface SignInSession {
  readonly id: string;
  readonly labId: string;
  readonly personId: string;
}

/** Days a session lives at most, and hours it may lie idle. */
export const sessionLimits = { absoluteDays: 7, idleHours: 8, graceSeconds: 10 } as const;

interface SessionRow {
  id: string;
  lab_id: string;
  person_id: string;
}

const sessionOf = (row: SessionRow): SignInSession => ({ id: row.id, labId: row.lab_id, personId: row.person_id });
const alive = (db: Database) => db('sign_in_sessions').whereNull('ended_at').where('expires_at', '>', db.fn.now())
  .whereRaw('last_used_at > now() - make_interval(hours => ?)', [sessionLimits.idleHours]);

export async function createSignInSession(db: Database, { labId, personId, refreshHash }: { labId: string; personId: string; refreshHash: Buffer }): Promise<string> {
  const [row]: { id: string }[] = await db('sign_in_sessions').insert({
    lab_id: labId, person_id: personId, refresh_hash: refreshHash, expires_at: db.raw('now() + make_interval(days => ?)', [sessionLimits.absoluteDays]),
  }).returning('id');
  if (!row) throw new Error('The session was not kept.');
  return row.id;
}

/** A session that still lives, by its id. */
export async function findSignInSession(db: Database, id: string): Promise<SignInSession | null> {
  const row: SessionRow | undefined = await alive(db).where({ id }).first('id', 'lab_id', 'person_id');
  return row ? sessionOf(row) : null;
}

export type Rotation =
  | { readonly kind: 'rotated'; readonly session: SignInSession }
  | { readonly kind: 'again'; readonly session: SignInSession; readonly sealedSuccessor: string }
  | { readonly kind: 'reused'; readonly session: SignInSession }
  | { readonly kind: 'unknown' };

/**
 * Exchanges a refresh token for its successor, once. A tab that comes with the predecessor within ten seconds gets the same successor
 * (sealed by the caller); any later use of an old token is theft and ends the session.
 */
export async function rotateRefreshToken(db: Database, { refreshHash, nextHash, sealedNext }: { refreshHash: Buffer; nextHash: Buffer; sealedNext: string }): Promise<Rotation> {
  return db.transaction(async (trx) => {
    const [rotated]: SessionRow[] = await alive(trx).where({ refresh_hash: refreshHash }).update({
      refresh_hash: nextHash, previous_hash: refreshHash, successor_sealed: sealedNext, rotated_at: trx.fn.now(), last_used_at: trx.fn.now(),
    }).returning(['id', 'lab_id', 'person_id']);
    if (rotated) return { kind: 'rotated', session: sessionOf(rotated) };
    const before: (SessionRow & { successor_sealed: string; in_grace: boolean }) | undefined = await alive(trx).where({ previous_hash: refreshHash })
      .first('id', 'lab_id', 'person_id', 'successor_sealed', trx.raw('rotated_at > now() - make_interval(secs => ?) as in_grace', [sessionLimits.graceSeconds]));
    if (!before) return { kind: 'unknown' };
    if (before.in_grace) return { kind: 'again', session: sessionOf(before), sealedSuccessor: before.successor_sealed };
    await endSignInSession(trx, before.id);
    return { kind: 'reused', session: sessionOf(before) };
  });
}

/** Ends a session; no token of it is accepted from now on. */
export async function endSignInSession(db: Database, id: string): Promise<void> {
  await db('sign_in_sessions').where({ id }).whereNull('ended_at').update({ ended_at: db.fn.now() });
}
