import type { Requirement } from '@leeside/contracts/requirements';
import type { Database } from './open-database.js';
import { pageFrom, readCursor, type Page } from './page-cursor.js';

interface RequirementRow {
  id: string;
  name: string;
  rule: Requirement['rule'];
  guard_factor: number;
  stands_for_ratio: number;
  created_at: string;
  segments: { from_hz: number; to_hz: number; from_db: number; to_db: number }[];
}

const requirementOf = (row: RequirementRow): Requirement => ({
  id: row.id, name: row.name, rule: row.rule, guardFactor: row.guard_factor, standsForRatio: row.stands_for_ratio, createdAt: row.created_at,
  segments: row.segments.map((segment) => ({ fromHz: segment.from_hz, toHz: segment.to_hz, fromDb: segment.from_db, toDb: segment.to_db })),
});

const requirements = (db: Database, labId: string) => db('requirements').where('requirements.lab_id', labId).select('requirements.*',
  db.raw(`(select json_agg(json_build_object('from_hz', from_hz, 'to_hz', to_hz, 'from_db', from_db, 'to_db', to_db) order by place)
    from requirement_segments where requirement_id = requirements.id) as segments`));

export async function listRequirements(db: Database, labId: string, page: { limit: number; cursor?: string | undefined }): Promise<Page<Requirement>> {
  const query = requirements(db, labId).orderBy(['name', 'id']).limit(page.limit + 1);
  const after = readCursor(page.cursor, 2);
  if (after) query.whereRaw('(name, id) > (?, ?::uuid)', after);
  const rows: RequirementRow[] = await query;
  return pageFrom(rows, page.limit, requirementOf, (row) => [row.name, row.id]);
}

export async function findRequirement(db: Database, labId: string, id: string): Promise<Requirement | null> {
  const row: RequirementRow | undefined = await requirements(db, labId).where('requirements.id', id).first();
  return row ? requirementOf(row) : null;
}

export interface NewRequirement {
  readonly name: string;
  readonly rule: Requirement['rule'];
  readonly guardFactor?: number | undefined;
  readonly standsForRatio?: number | undefined;
  readonly segments: Requirement['segments'];
}

export async function createRequirement(trx: Database, labId: string, requirement: NewRequirement): Promise<string> {
  const [row]: { id: string }[] = await trx('requirements').insert({
    lab_id: labId, name: requirement.name, rule: requirement.rule, guard_factor: requirement.guardFactor ?? 1, stands_for_ratio: requirement.standsForRatio ?? 1.1,
  }).returning('id');
  if (!row) throw new Error('The requirement was not kept.');
  await trx('requirement_segments').insert(requirement.segments.map((segment, place) => ({
    lab_id: labId, requirement_id: row.id, place, from_hz: segment.fromHz, to_hz: segment.toHz, from_db: segment.fromDb, to_db: segment.toDb,
  })));
  return row.id;
}
