import type { Database } from './open-database.js';

export type TokenScope = 'read' | 'write';
export interface ApiToken {
  readonly id: string;
  readonly name: string;
  readonly scopes: TokenScope[];
  readonly createdAt: string;
  readonly lastUsedAt: string | null;
}

interface TokenRow {
  id: string;
  name: string;
  scopes: TokenScope[];
  created_at: string;
  last_used_at: string | null;
}

export async function createApiToken(db: Database, token: { labId: string; personId: string; name: string; tokenHash: Buffer; scopes: TokenScope[] }): Promise<string> {
  const [row]: { id: string }[] = await db('api_tokens').insert({
    lab_id: token.labId, person_id: token.personId, name: token.name, token_hash: token.tokenHash, scopes: token.scopes,
  }).returning('id');
  if (!row) throw new Error('The token was not kept.');
  return row.id;
}

/** Whose token it is, and what it may; its last use is noted at most once a minute. */
export async function findApiToken(db: Database, tokenHash: Buffer): Promise<{ id: string; personId: string; scopes: TokenScope[] } | null> {
  const row: { id: string; person_id: string; scopes: TokenScope[] } | undefined = await db('api_tokens').where({ token_hash: tokenHash }).whereNull('revoked_at').first('id', 'person_id', 'scopes');
  if (!row) return null;
  await db('api_tokens').where({ id: row.id }).whereRaw("(last_used_at is null or last_used_at < now() - interval '1 minute')").update({ last_used_at: db.fn.now() });
  return { id: row.id, personId: row.person_id, scopes: row.scopes };
}

export async function listApiTokens(db: Database, personId: string): Promise<ApiToken[]> {
  const rows: TokenRow[] = await db('api_tokens').where({ person_id: personId }).whereNull('revoked_at').orderBy('created_at', 'desc');
  return rows.map((row) => ({ id: row.id, name: row.name, scopes: row.scopes, createdAt: row.created_at, lastUsedAt: row.last_used_at }));
}

/** Revokes a token of a person; false where there is none. */
export async function revokeApiToken(db: Database, personId: string, id: string): Promise<boolean> {
  return (await db('api_tokens').where({ id, person_id: personId }).whereNull('revoked_at').update({ revoked_at: db.fn.now() })) === 1;
}
