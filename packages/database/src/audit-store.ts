import { createHash } from 'node:crypto';
import { canonicalJson } from './canonical-json.js';
import type { Database } from './open-database.js';

export interface AuditEntry {
  readonly labId: string;
  readonly personId: string | null;
  readonly action: string;
  readonly subjectKind: string;
  readonly subjectId: string | null;
  readonly details?: Record<string, unknown>;
}

/** Hash of an entry over the one before it: a changed, missing or inserted row breaks the chain. */
export function auditHash(previousHash: string, entry: AuditEntry, at: string): string {
  const text = canonicalJson([previousHash, entry.labId, entry.personId, entry.action, entry.subjectKind, entry.subjectId, entry.details ?? {}, at]);
  return createHash('sha256').update(text).digest('hex');
}

/** Adds an entry in the caller's transaction; entries of one lab are added one after the other. */
export async function recordAudit(trx: Database, entry: AuditEntry): Promise<void> {
  await trx.raw('select pg_advisory_xact_lock(hashtextextended(?, 7))', [entry.labId]);
  const last: { hash: string } | undefined = await trx('audit_events').where({ lab_id: entry.labId }).orderBy('id', 'desc').first('hash');
  const previousHash = last?.hash ?? '';
  const at = new Date().toISOString();
  await trx('audit_events').insert({
    lab_id: entry.labId, person_id: entry.personId, action: entry.action, subject_kind: entry.subjectKind, subject_id: entry.subjectId,
    details: JSON.stringify(entry.details ?? {}), at, previous_hash: previousHash, hash: auditHash(previousHash, entry, at),
  });
}
