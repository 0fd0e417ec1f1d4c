import { z } from 'zod';

const schema = z.object({
  DATABASE_URL: z.url(), REDIS_URL: z.url(), OBJECT_STORE_DIR: z.string().min(1), DATA_DIR: z.string().min(1),
  PORT: z.coerce.number().int().min(0).max(65_535).default(8080), BASE_URL: z.url().optional(),
  ACCESS_TOKEN_SECRET: z.string().min(32, 'must be 32 characters or more'), LEESIDE_MODE: z.enum(['demo', 'empty']).default('demo'), WEB_DIST: z.string().optional(),
  DEMO_PASSWORD: z.string().min(8).optional(), LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
});

/** What the environment says; the only reader of it. */
export interface Configuration {
  readonly databaseUrl: string;
  readonly redisUrl: string;
  readonly objectStoreFolder: string;
  readonly dataFolder: string;
  readonly port: number;
  readonly baseUrl: string;
  readonly tokenSecret: string;
  readonly mode: 'demo' | 'empty';
  readonly webFolder: string | null;
  readonly demoPassword: string | null;
  readonly logLevel: string;
}

/** Reads the configuration; a fault names every variable that is wrong. */
export function readConfiguration(environment: NodeJS.ProcessEnv = process.env): Configuration {
  const parsed = schema.safeParse(environment);
  if (!parsed.success) throw new Error(`The environment is not complete: ${parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join('; ')}`);
  const { data } = parsed;
  return {
    databaseUrl: data.DATABASE_URL, redisUrl: data.REDIS_URL, objectStoreFolder: data.OBJECT_STORE_DIR, dataFolder: data.DATA_DIR, port: data.PORT,
    baseUrl: data.BASE_URL ?? `http://127.0.0.1:${data.PORT}`, tokenSecret: data.ACCESS_TOKEN_SECRET, mode: data.LEESIDE_MODE, webFolder: data.WEB_DIST ?? null,
    demoPassword: data.DEMO_PASSWORD ?? null, logLevel: data.LOG_LEVEL,
  };
}
