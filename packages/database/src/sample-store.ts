import type { Sample } from '@leeside/contracts/samples';
import type { Database } from './open-database.js';
import { pageFrom, readCursor, type Page } from './page-cursor.js';

interface SampleRow {
  id: string;
  code: string;
  name: string;
  state: Sample['state'];
  lot_id: string | null;
  lot_code: string | null;
  design_id: string | null;
  design_name: string | null;
  client_id: string | null;
  client_name: string | null;
  inside_size_m: number[] | null;
  notes: string | null;
  created_at: string;
}

const sampleOf = (row: SampleRow): Sample => ({
  id: row.id, code: row.code, name: row.name, state: row.state, lotId: row.lot_id, lotCode: row.lot_code, designId: row.design_id, designName: row.design_name,
  clientId: row.client_id, clientName: row.client_name, insideSizeM: row.inside_size_m, notes: row.notes, createdAt: row.created_at,
});

/** Whose samples may be seen: all of a lab's, or only those of one client. */
export interface SampleScope {
  readonly labId: string;
  readonly clientId: string | null;
}

const samplesIn = (db: Database, { labId, clientId }: SampleScope) => {
  const query = db('samples').leftJoin('lots', 'lots.id', 'samples.lot_id').leftJoin('designs', 'designs.id', db.raw('coalesce(samples.design_id, lots.design_id)'))
    .leftJoin('clients', 'clients.id', 'samples.client_id').where('samples.lab_id', labId)
    .select('samples.*', 'lots.code as lot_code', 'designs.name as design_name', 'clients.name as client_name');
  return clientId === null ? query : query.where('samples.client_id', clientId);
};

export async function listSamples(db: Database, scope: SampleScope, page: { limit: number; cursor?: string | undefined; code?: string | undefined }): Promise<Page<Sample>> {
  const query = samplesIn(db, scope).orderBy([{ column: 'samples.created_at', order: 'desc' }, { column: 'samples.id' }]).limit(page.limit + 1);
  const after = readCursor(page.cursor, 2);
  if (after) query.whereRaw('(samples.created_at, samples.id) < (?::timestamptz, ?::uuid)', after);
  if (page.code !== undefined) query.where('samples.code', page.code);
  const rows: SampleRow[] = await query.clearOrder().orderBy([{ column: 'samples.created_at', order: 'desc' }, { column: 'samples.id', order: 'desc' }]);
  return pageFrom(rows, page.limit, sampleOf, (row) => [row.created_at, row.id]);
}

export async function findSample(db: Database, scope: SampleScope, id: string): Promise<Sample | null> {
  const row: SampleRow | undefined = await samplesIn(db, scope).where('samples.id', id).first();
  return row ? sampleOf(row) : null;
}

export interface NewSample {
  readonly code: string;
  readonly name: string;
  readonly lotId?: string | undefined;
  readonly designId?: string | undefined;
  readonly clientId?: string | undefined;
  readonly insideSizeM?: readonly number[] | undefined;
  readonly notes?: string | undefined;
}

/** Takes a sample in; null where its code is taken. */
export async function createSample(db: Database, labId: string, sample: NewSample): Promise<string | null> {
  const [row]: { id: string }[] = await db('samples').insert({
    lab_id: labId, code: sample.code, name: sample.name, lot_id: sample.lotId ?? null, design_id: sample.designId ?? null, client_id: sample.clientId ?? null,
    inside_size_m: sample.insideSizeM ?? null, notes: sample.notes ?? null,
  }).onConflict(['lab_id', 'code']).ignore().returning('id');
  return row?.id ?? null;
}

/** Codes of all samples of a lab, for finding them in file names. */
export async function listSampleCodes(db: Database, labId: string): Promise<{ id: string; code: string }[]> {
  return db('samples').where({ lab_id: labId }).select('id', 'code');
}

/** Which of these ids are rows of the lab in a table: foreign ids are as good as none. */
export async function belongsToLab(db: Database, table: 'samples' | 'lots' | 'designs' | 'clients' | 'requirements', labId: string, id: string): Promise<boolean> {
  const row: unknown = await db(table).where({ id, lab_id: labId }).first('id');
  return row !== undefined;
}

/** A sample that has a curve is measured, unless somebody has said more of it already. */
export async function markSampleMeasured(trx: Database, labId: string, id: string): Promise<void> {
  await trx('samples').where({ id, lab_id: labId }).whereIn('state', ['received', 'on the bench']).update({ state: 'measured' });
}
