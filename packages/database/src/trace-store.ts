import type { MeasuringRole } from '@leeside/contracts/measuring-roles';
import type { SweepSettingsBody } from '@leeside/contracts/sweep-settings';
import type { Trace } from '@leeside/contracts/traces';
import type { Database } from './open-database.js';

interface TraceRow {
  id: string;
  session_id: string;
  file_id: string;
  file_name: string;
  name: string;
  role: MeasuringRole | null;
  role_guessed: boolean;
  sample_id: string | null;
  sample_guessed: boolean;
  condition: string;
  polarisation: string;
  position: string;
  measured_at: string | null;
  chain_loss_db: number | null;
  transmit_level_dbm: number | null;
  paired_with: string | null;
  point_count: number;
  start_hz: number;
  stop_hz: number;
  level_unit: Trace['levelUnit'];
  settings: SweepSettingsBody;
  peak_frequency_hz: number;
  peak_level: number;
  style: NonNullable<Trace['style']> | null;
  set_aside: string | null;
  version: number;
  upload_order: number;
  place_in_file: number;
}

/** A trace with what decides its order. */
export type KeptTrace = Trace & { readonly uploadOrder: number };

const traceOf = (row: TraceRow): KeptTrace => ({
  id: row.id, sessionId: row.session_id, fileId: row.file_id, name: row.name, fileName: row.file_name, role: row.role, roleGuessed: row.role_guessed, sampleId: row.sample_id,
  sampleGuessed: row.sample_guessed, condition: row.condition, polarisation: row.polarisation, position: row.position, measuredAt: row.measured_at, chainLossDb: row.chain_loss_db,
  transmitLevelDbm: row.transmit_level_dbm, pairedWith: row.paired_with, pointCount: row.point_count, startHz: row.start_hz, stopHz: row.stop_hz, levelUnit: row.level_unit,
  settings: row.settings, peak: { frequencyHz: row.peak_frequency_hz, level: row.peak_level }, version: row.version, uploadOrder: row.upload_order * 64 + row.place_in_file,
  ...(row.style === null ? {} : { style: row.style }), ...(row.set_aside === null ? {} : { setAside: row.set_aside }),
});

const traces = (db: Database, labId: string) => db('traces').join('files', 'files.id', 'traces.file_id').where('traces.lab_id', labId)
  .select('traces.*', 'files.name as file_name', 'files.upload_order');

/** Traces of a session in the order in which they came; those of files that were set aside are left out. */
export async function listTraces(db: Database, labId: string, sessionId: string): Promise<KeptTrace[]> {
  const rows: TraceRow[] = await traces(db, labId).where('traces.session_id', sessionId).whereNull('files.set_aside_at').orderBy(['files.upload_order', 'traces.place_in_file']);
  return rows.map(traceOf);
}

export async function findTrace(db: Database, labId: string, id: string): Promise<KeptTrace | null> {
  const row: TraceRow | undefined = await traces(db, labId).where('traces.id', id).first();
  return row ? traceOf(row) : null;
}

export interface NewTrace {
  readonly id: string;
  readonly fileId: string;
  readonly placeInFile: number;
  readonly name: string;
  readonly role: MeasuringRole | null;
  readonly roleGuessed: boolean;
  readonly sampleId: string | null;
  readonly sampleGuessed: boolean;
  readonly condition: string;
  readonly polarisation: string;
  readonly position: string;
  readonly measuredAt: string | null;
  readonly chainLossDb: number | null;
  readonly transmitLevelDbm: number | null;
  readonly pointCount: number;
  readonly startHz: number;
  readonly stopHz: number;
  readonly levelUnit: Trace['levelUnit'];
  readonly settings: SweepSettingsBody;
  readonly peak: { readonly frequencyHz: number; readonly level: number };
}

export async function insertTraces(trx: Database, scope: { labId: string; sessionId: string }, items: readonly NewTrace[]): Promise<void> {
  if (items.length === 0) return;
  await trx('traces').insert(items.map((item) => ({
    id: item.id, lab_id: scope.labId, session_id: scope.sessionId, file_id: item.fileId, place_in_file: item.placeInFile, name: item.name, role: item.role, role_guessed: item.roleGuessed,
    sample_id: item.sampleId, sample_guessed: item.sampleGuessed, condition: item.condition, polarisation: item.polarisation, position: item.position, measured_at: item.measuredAt,
    chain_loss_db: item.chainLossDb, transmit_level_dbm: item.transmitLevelDbm, point_count: item.pointCount, start_hz: item.startHz, stop_hz: item.stopHz, level_unit: item.levelUnit,
    settings: JSON.stringify(item.settings), peak_frequency_hz: item.peak.frequencyHz, peak_level: item.peak.level,
  })));
}

export interface TraceChange {
  readonly role?: MeasuringRole | undefined;
  readonly sampleId?: string | null | undefined;
  readonly condition?: string | undefined;
  readonly polarisation?: string | undefined;
  readonly position?: string | undefined;
  readonly measuredAt?: string | null | undefined;
  readonly chainLossDb?: number | null | undefined;
  readonly transmitLevelDbm?: number | null | undefined;
  readonly pairedWith?: string | null | undefined;
  readonly setAside?: string | null | undefined;
}

/** What a change sets: what a person says is no guess any more. */
function columnsOf(change: TraceChange): Record<string, unknown> {
  const columns: Record<string, unknown> = {
    role: change.role, sample_id: change.sampleId, condition: change.condition, polarisation: change.polarisation, position: change.position, measured_at: change.measuredAt,
    chain_loss_db: change.chainLossDb, transmit_level_dbm: change.transmitLevelDbm, paired_with: change.pairedWith, set_aside: change.setAside,
    role_guessed: change.role === undefined ? undefined : false, sample_guessed: change.sampleId === undefined ? undefined : false,
  };
  return Object.fromEntries(Object.entries(columns).filter(([, value]) => value !== undefined));
}

/** Changes a trace if it still is the version the caller saw; false where it is not. */
export async function changeTrace(trx: Database, labId: string, { id, version }: { id: string; version: number }, change: TraceChange): Promise<boolean> {
  return (await trx('traces').where({ id, lab_id: labId, version }).update({ ...columnsOf(change), version: version + 1 })) === 1;
}

/** Notes by which style each reference was read. */
export async function setTraceStyles(trx: Database, styles: ReadonlyMap<string, NonNullable<Trace['style']>>): Promise<void> {
  for (const style of new Set(styles.values())) {
    const ids = [...styles].filter(([, value]) => value === style).map(([id]) => id);
    await trx('traces').whereIn('id', ids).whereRaw('style is distinct from ?', [style]).update({ style });
  }
}
