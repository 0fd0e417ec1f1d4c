import knex, { type Knex } from 'knex';
import pg from 'pg';

/** A connection pool or a transaction: every store takes either. Inside a transaction only the transaction may be used. */
export type Database = Knex;

const int8 = 20;
const date = 1082;
const timestamptz = 1184;
pg.types.setTypeParser(int8, Number);
pg.types.setTypeParser(date, (text) => text);
pg.types.setTypeParser(timestamptz, (text) => new Date(text).toISOString());

export interface DatabaseOptions {
  readonly url: string;
  /** Connections at most; the sum over all processes must stay below the server's max_connections. */
  readonly poolSize: number;
  readonly statementTimeoutMs?: number;
}

/**
 * Opens the pool. A connection that cannot be had within 3 s fails, so that a request is answered 503 instead of hanging; statements,
 * locks and forgotten transactions are cut by the server.
 */
export function openDatabase({ url, poolSize, statementTimeoutMs = 30_000 }: DatabaseOptions): Database {
  const silent = (): void => undefined;
  return knex({
    client: 'pg',
    connection: {
      connectionString: url, connectionTimeoutMillis: 3000, keepAlive: true,
      statement_timeout: statementTimeoutMs, lock_timeout: 10_000, idle_in_transaction_session_timeout: 60_000,
    } as Knex.PgConnectionConfig,
    pool: { min: 0, max: poolSize, idleTimeoutMillis: 30_000 },
    acquireConnectionTimeout: 3000,
    log: { warn: silent, error: silent, deprecate: silent, debug: silent },
  });
}

/** Runs a piece of work in one transaction; an exception undoes all of it. */
export function inTransaction<Result>(db: Database, work: (trx: Database) => Promise<Result>): Promise<Result> {
  return db.transaction((trx) => work(trx));
}

/** Whether the server answers, and which migration it has. */
export async function readSchemaVersion(db: Database): Promise<string | null> {
  const row: { name: string } | undefined = await db('knex_migrations').select('name').orderBy('id', 'desc').first().timeout(1000);
  return row?.name ?? null;
}
