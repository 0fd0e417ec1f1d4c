import { randomBytes } from 'node:crypto';
import { migrateToLatest } from '@leeside/database/migrate';
import { openDatabase } from '@leeside/database/open-database';

/** An address of the services that the tests run on; `docker-less-scripts/test` and `docker-less-scripts/services env` set them. */
export function serviceUrl(name: 'DATABASE_ADMIN_URL' | 'REDIS_URL'): string {
  const url = process.env[name];
  if (url === undefined) throw new Error(`${name} is not set. Run: eval "$(docker-less-scripts/services env)"`);
  return url;
}

/** A database of its own for a test, brought to the newest schema, and how to drop it. */
export async function freshDatabase(): Promise<{ url: string; drop: () => Promise<void> }> {
  const adminUrl = serviceUrl('DATABASE_ADMIN_URL');
  const name = `test_${randomBytes(6).toString('hex')}`;
  const asAdmin = async (statement: string): Promise<void> => {
    const db = openDatabase({ url: adminUrl, poolSize: 1 });
    await db.raw(statement);
    await db.destroy();
  };
  await asAdmin(`create database ${name}`);
  const url = new URL(adminUrl);
  url.pathname = `/${name}`;
  await migrateToLatest(url.href);
  return { url: url.href, drop: () => asAdmin(`drop database if exists ${name} with (force)`) };
}
