import type { SessionEvent } from '@leeside/contracts/session-events';
import type { Database } from '@leeside/database/open-database';
import type { ObjectStore } from '@leeside/object-store/object-store';
import type { Logger } from 'pino';
import type { ReaderPool } from './reading/reader-pool.js';

/** What every job needs. */
export interface WorkerTools {
  readonly db: Database;
  readonly store: ObjectStore;
  readonly readers: ReaderPool;
  readonly publish: (sessionId: string, event: SessionEvent) => Promise<void>;
  readonly log: Logger;
  /** Whether the worker was asked to stop: long jobs give back what they have not begun. */
  readonly isStopping: () => boolean;
}
