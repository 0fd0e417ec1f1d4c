import type { Database } from '@leeside/database/open-database';
import type { RateCounter } from '@leeside/job-queue/rate-counter';
import type { EventSubscriber } from '@leeside/job-queue/session-event-bus';
import type { ObjectStore } from '@leeside/object-store/object-store';
import type { Logger } from 'pino';

/** What every feature may use. */
export interface ApiTools {
  readonly db: Database;
  readonly store: ObjectStore;
  readonly events: EventSubscriber;
  readonly limits: { readonly signInByAccount: RateCounter; readonly signInByAddress: RateCounter };
  readonly pingRedis: () => Promise<unknown>;
  readonly log: Logger;
  readonly tokenSecret: string;
  readonly baseUrl: string;
  readonly webFolder: string | null;
}
