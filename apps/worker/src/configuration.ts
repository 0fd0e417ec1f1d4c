import { z } from 'zod';

const schema = z.object({
  DATABASE_URL: z.url(), REDIS_URL: z.url(), OBJECT_STORE_DIR: z.string().min(1),
  JOB_QUEUE_PREFIX: z.string().regex(/^[\w-]+$/).default('leeside'),
  WORKER_CONCURRENCY: z.coerce.number().int().min(1).max(32).default(2),
  RECONCILE_SECONDS: z.coerce.number().positive().default(30),
  LOST_AFTER_SECONDS: z.coerce.number().positive().default(60),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
});

/** What the environment says; the only reader of it. */
export interface Configuration {
  readonly databaseUrl: string;
  readonly redisUrl: string;
  readonly objectStoreFolder: string;
  readonly queuePrefix: string;
  readonly concurrency: number;
  readonly reconcileEverySeconds: number;
  readonly lostAfterSeconds: number;
  readonly logLevel: string;
}

/** Reads the configuration; a fault names every variable that is wrong. */
export function readConfiguration(environment: NodeJS.ProcessEnv = process.env): Configuration {
  const parsed = schema.safeParse(environment);
  if (!parsed.success) throw new Error(`The environment is not complete: ${parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join('; ')}`);
  const { data } = parsed;
  return {
    databaseUrl: data.DATABASE_URL, redisUrl: data.REDIS_URL, objectStoreFolder: data.OBJECT_STORE_DIR, queuePrefix: data.JOB_QUEUE_PREFIX, concurrency: data.WORKER_CONCURRENCY,
    reconcileEverySeconds: data.RECONCILE_SECONDS, lostAfterSeconds: data.LOST_AFTER_SECONDS, logLevel: data.LOG_LEVEL,
  };
}
