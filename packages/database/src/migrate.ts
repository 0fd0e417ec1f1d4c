import { readdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { openDatabase } from './open-database.js';

const lockKey = 7_305_411;

/** The folder `migrations/` at the root of the repository. */
export const migrationsFolder = join(dirname(fileURLToPath(import.meta.url)), '..', '..', '..', 'migrations');

/** Name of the newest migration in the folder: what a running server must have. */
export function newestMigration(): string {
  return readdirSync(migrationsFolder).filter((name) => name.endsWith('.mjs')).sort().at(-1) ?? '';
}

/**
 * Brings a database to the newest schema, under an advisory lock so that several processes may try at once.
 * @param url address of the database.
 * @returns names of the migrations that were carried out.
 */
export async function migrateToLatest(url: string): Promise<string[]> {
  const db = openDatabase({ url, poolSize: 3, statementTimeoutMs: 600_000 });
  try {
    return await db.transaction(async (lock) => {
      await lock.raw('set local idle_in_transaction_session_timeout = 0');
      await lock.raw('set local lock_timeout = 0');
      await lock.raw('select pg_advisory_xact_lock(?)', [lockKey]);
      const [, names]: [number, string[]] = await db.migrate.latest({ directory: migrationsFolder, loadExtensions: ['.mjs'] });
      return names;
    });
  } finally {
    await db.destroy();
  }
}
