import type { MeasuringRole } from '@leeside/contracts/measuring-roles';
import type { TypedLevelBody } from '@leeside/contracts/levels';
import type { Database } from './open-database.js';

interface LevelRow {
  id: string;
  role: MeasuringRole;
  sample_id: string | null;
  condition: string;
  frequency_hz: number;
  level_dbm: number;
  in_the_noise: boolean;
  entry_order: number;
  entered_at: string;
}

export type KeptLevel = TypedLevelBody & { readonly order: number };

const levelOf = (row: LevelRow): KeptLevel => ({
  id: row.id, role: row.role, sampleId: row.sample_id, condition: row.condition, frequencyHz: row.frequency_hz, levelDbm: row.level_dbm, inTheNoise: row.in_the_noise,
  enteredAt: row.entered_at, order: row.entry_order,
});

export interface NewLevel {
  readonly role: MeasuringRole;
  readonly sampleId?: string | undefined;
  readonly condition?: string | undefined;
  readonly frequencyHz: number;
  readonly levelDbm: number;
  readonly inTheNoise?: boolean | undefined;
}

export async function insertLevels(trx: Database, scope: { labId: string; sessionId: string; personId: string }, levels: readonly NewLevel[]): Promise<KeptLevel[]> {
  const rows: LevelRow[] = await trx('typed_levels').insert(levels.map((level) => ({
    lab_id: scope.labId, session_id: scope.sessionId, role: level.role, sample_id: level.role === 'enclosed' ? (level.sampleId ?? null) : null, condition: level.condition ?? '',
    frequency_hz: level.frequencyHz, level_dbm: level.levelDbm, in_the_noise: level.inTheNoise ?? false, entered_by: scope.personId,
  }))).returning('*');
  return rows.map(levelOf);
}

export async function listLevels(db: Database, labId: string, sessionId: string): Promise<KeptLevel[]> {
  const rows: LevelRow[] = await db('typed_levels').where({ lab_id: labId, session_id: sessionId }).orderBy('entry_order');
  return rows.map(levelOf);
}

/** Takes a typed level out; its session, or null where there is none. */
export async function deleteLevel(trx: Database, labId: string, id: string): Promise<string | null> {
  const [row]: { session_id: string }[] = await trx('typed_levels').where({ id, lab_id: labId }).delete().returning('session_id');
  return row?.session_id ?? null;
}
