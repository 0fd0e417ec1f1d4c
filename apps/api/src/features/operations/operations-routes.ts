import { newestMigration } from '@leeside/database/migrate';
import { readSchemaVersion } from '@leeside/database/open-database';
import express, { type Router } from 'express';
import type { ApiTools } from '../../api-tools.js';

const longestCheckMs = 1000;

async function check(work: () => Promise<unknown>): Promise<string> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<never>((_resolve, reject) => {
    timer = setTimeout(() => reject(new Error('no answer within a second')), longestCheckMs);
  });
  try {
    await Promise.race([work(), late]);
    return 'ok';
  } catch (fault) {
    return fault instanceof Error ? fault.message.split('\n')[0] ?? 'failed' : 'failed';
  } finally {
    clearTimeout(timer);
  }
}

async function checkSchema(tools: ApiTools): Promise<void> {
  const found = await readSchemaVersion(tools.db);
  if (found !== newestMigration()) throw new Error(`schema ${found ?? 'none'}, need ${newestMigration()}`);
}

/** Liveness touches nothing; readiness asks what the work needs. Without Redis analysis is delayed, and that is said. */
export function operationsRouter(tools: ApiTools, version: string): Router {
  const router = express.Router();
  router.get('/livez', (_request, response) => void response.json({ status: 'ok' }));
  router.get('/version', (_request, response) => void response.json({ version }));
  router.get('/readyz', async (_request, response) => {
    const [database, store, queue] = await Promise.all([check(() => checkSchema(tools)), check(() => tools.store.check()), check(tools.pingRedis)]);
    const isDown = database !== 'ok' || store !== 'ok';
    response.status(isDown ? 503 : 200).set('Cache-Control', 'no-store').json({ status: isDown ? 'down' : queue === 'ok' ? 'ok' : 'degraded', checks: { database, store, queue } });
  });
  return router;
}
