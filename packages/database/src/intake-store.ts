import type { Database } from './open-database.js';

interface DesignRow {
  id: string;
  name: string;
  kind: string;
  closure: string;
  layers: number;
  inside_size_m: number[] | null;
}

export async function listClients(db: Database, labId: string): Promise<{ id: string; name: string }[]> {
  return db('clients').where({ lab_id: labId }).orderBy('name').select('id', 'name');
}

export async function createClient(db: Database, labId: string, name: string): Promise<string> {
  const [row]: { id: string }[] = await db('clients').insert({ lab_id: labId, name }).returning('id');
  if (!row) throw new Error('The client was not kept.');
  return row.id;
}

export async function listDesigns(db: Database, labId: string): Promise<{ id: string; name: string; kind: string; closure: string; layers: number; insideSizeM: number[] | null }[]> {
  const rows: DesignRow[] = await db('designs').where({ lab_id: labId }).orderBy('name');
  return rows.map((row) => ({ id: row.id, name: row.name, kind: row.kind, closure: row.closure, layers: row.layers, insideSizeM: row.inside_size_m }));
}

export interface NewDesign {
  readonly labId: string;
  readonly clientId?: string;
  readonly name: string;
  readonly kind: string;
  readonly closure: string;
  readonly layers: number;
  readonly insideSizeM?: readonly number[];
}

export async function createDesign(db: Database, design: NewDesign): Promise<string> {
  const [row]: { id: string }[] = await db('designs').insert({
    lab_id: design.labId, client_id: design.clientId ?? null, name: design.name, kind: design.kind, closure: design.closure, layers: design.layers,
    inside_size_m: design.insideSizeM ?? null,
  }).returning('id');
  if (!row) throw new Error('The design was not kept.');
  return row.id;
}

interface LotRow {
  id: string;
  code: string;
  design_id: string;
  design_name: string;
  state: 'open' | 'released' | 'held';
  received_on: string | null;
  quantity: number | null;
}

export async function listLots(db: Database, labId: string): Promise<{ id: string; code: string; designId: string; designName: string; state: LotRow['state']; receivedOn: string | null; quantity: number | null }[]> {
  const rows: LotRow[] = await db('lots').join('designs', 'designs.id', 'lots.design_id').where({ 'lots.lab_id': labId }).orderBy('lots.created_at', 'desc').select('lots.*', 'designs.name as design_name');
  return rows.map((row) => ({ id: row.id, code: row.code, designId: row.design_id, designName: row.design_name, state: row.state, receivedOn: row.received_on, quantity: row.quantity }));
}

export interface NewLot {
  readonly labId: string;
  readonly designId: string;
  readonly code: string;
  readonly madeOn?: string;
  readonly receivedOn?: string;
  readonly quantity?: number;
}

export async function createLot(db: Database, lot: NewLot): Promise<string> {
  const [row]: { id: string }[] = await db('lots').insert({
    lab_id: lot.labId, design_id: lot.designId, code: lot.code, made_on: lot.madeOn ?? null, received_on: lot.receivedOn ?? null, quantity: lot.quantity ?? null,
  }).returning('id');
  if (!row) throw new Error('The lot was not kept.');
  return row.id;
}
