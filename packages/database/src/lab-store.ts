import type { Database } from './open-database.js';

export interface Lab {
  readonly id: string;
  readonly name: string;
  readonly timeZone: string;
  readonly floorMarginDb: number;
  readonly driftLimitDb: number;
}

interface LabRow {
  id: string;
  name: string;
  time_zone: string;
  floor_margin_db: number;
  drift_limit_db: number;
}

const labOf = (row: LabRow): Lab => ({ id: row.id, name: row.name, timeZone: row.time_zone, floorMarginDb: row.floor_margin_db, driftLimitDb: row.drift_limit_db });

export async function findLab(db: Database, labId: string): Promise<Lab | null> {
  const row: LabRow | undefined = await db('labs').where({ id: labId }).first();
  return row ? labOf(row) : null;
}

export async function listLabs(db: Database): Promise<Lab[]> {
  const rows: LabRow[] = await db('labs').orderBy('created_at');
  return rows.map(labOf);
}

export async function createLab(db: Database, name: string): Promise<Lab> {
  const [row]: LabRow[] = await db('labs').insert({ name }).returning('*');
  if (!row) throw new Error('The lab was not kept.');
  return labOf(row);
}

/** Leaves the hash of a one-time link for the first administrator; a newer one replaces an older. */
export async function keepFirstAdminLink(db: Database, labId: string, tokenHash: Buffer): Promise<void> {
  await db('first_admin_links').insert({ lab_id: labId, token_hash: tokenHash }).onConflict('lab_id').merge({ token_hash: tokenHash, used_at: null });
}

/** Uses a one-time link up; answers its lab the first time and null ever after. */
export async function useFirstAdminLink(db: Database, tokenHash: Buffer): Promise<string | null> {
  const [row]: { lab_id: string }[] = await db('first_admin_links').where({ token_hash: tokenHash }).whereNull('used_at').update({ used_at: db.fn.now() }).returning('lab_id');
  return row?.lab_id ?? null;
}
