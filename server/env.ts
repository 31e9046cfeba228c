import { z } from 'zod';

const port = z.coerce.number().int().min(0).max(65_535);

const envSchema = z.object({
  NODE_ENV: z.enum(['development', 'test', 'production']).default('development'),
  PORT: port.default(4173),
  TAUTLINE_HOST: z.string().default('127.0.0.1'),
  TAUTLINE_ORIGIN: z.url().optional(),
  TAUTLINE_TRUST_PROXY: z.string().default(''),
  TAUTLINE_SESSION_SECRET: z.string().default(''),
  TAUTLINE_DEV: z.enum(['0', '1']).default('0'),
  TAUTLINE_DEMO: z.enum(['0', '1']).default('0'),
  TAUTLINE_DB_HOST: z.string().default('127.0.0.1'),
  TAUTLINE_DB_PORT: port,
  TAUTLINE_DB_NAME: z.string().default('tautline'),
  TAUTLINE_DB_USER: z.string(),
  TAUTLINE_DB_PASSWORD: z.string(),
  TAUTLINE_DB_MIGRATION_USER: z.string().optional(),
  TAUTLINE_DB_MIGRATION_PASSWORD: z.string().optional(),
  TAUTLINE_BCRYPT_COST: z.coerce.number().int().min(4).max(15).optional(),
  TAUTLINE_LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).default('info'),
});

export type DatabaseSettings = {
  host: string;
  port: number;
  database: string;
  user: string;
  password: string;
};

export type Env = {
  mode: 'development' | 'test' | 'production';
  port: number;
  host: string;
  /** Public origin when the product stands behind TLS; null in plain mode. */
  origin: string | null;
  trustProxy: string[];
  /** Newest first; older ones still open the sessions they signed. */
  sessionSecrets: string[];
  demo: boolean;
  /** Vite inside this server, with hot reload. */
  hotReload: boolean;
  database: DatabaseSettings;
  migration: DatabaseSettings | null;
  bcryptCost: number;
  logLevel: 'silent' | 'error' | 'warn' | 'info' | 'debug';
};

const sampleSecret = /^(.)\1*$|changeme|secret|example|sample|password/i;

/**
 * Settings from the environment.
 *
 * @throws Error that names the variable, never its value
 */
export function readEnv(source: Record<string, string | undefined>): Env {
  const parsed = envSchema.safeParse(source);
  if (!parsed.success) {
    const names = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`Settings that cannot be used:\n  ${names.join('\n  ')}`);
  }
  const values = parsed.data;
  const production = values.NODE_ENV === 'production';
  const sessionSecrets = values.TAUTLINE_SESSION_SECRET.split(',').filter((s) => s !== '');
  for (const secret of sessionSecrets) {
    if (Buffer.byteLength(secret) < 32 || (production && sampleSecret.test(secret))) {
      throw new Error(
        'TAUTLINE_SESSION_SECRET: each secret must be 32 random bytes or more, not a word or a sample.',
      );
    }
  }
  if (sessionSecrets.length === 0) {
    throw new Error('TAUTLINE_SESSION_SECRET: set it to 32 random bytes or more.');
  }
  if (production && values.TAUTLINE_DEMO === '1') {
    throw new Error('TAUTLINE_DEMO: demo data are never seeded in production.');
  }
  const database = {
    host: values.TAUTLINE_DB_HOST,
    port: values.TAUTLINE_DB_PORT,
    database: values.TAUTLINE_DB_NAME,
  };
  return {
    mode: values.NODE_ENV,
    port: values.PORT,
    host: values.TAUTLINE_HOST,
    origin: values.TAUTLINE_ORIGIN ?? null,
    trustProxy: values.TAUTLINE_TRUST_PROXY.split(',')
      .map((s) => s.trim())
      .filter((s) => s !== ''),
    sessionSecrets,
    demo: values.TAUTLINE_DEMO === '1',
    hotReload: values.TAUTLINE_DEV === '1' && !production,
    database: { ...database, user: values.TAUTLINE_DB_USER, password: values.TAUTLINE_DB_PASSWORD },
    migration:
      values.TAUTLINE_DB_MIGRATION_USER === undefined
        ? null
        : {
            ...database,
            user: values.TAUTLINE_DB_MIGRATION_USER,
            password: values.TAUTLINE_DB_MIGRATION_PASSWORD ?? '',
          },
    // A cheaper hash is for tests only.
    bcryptCost: values.NODE_ENV === 'test' ? (values.TAUTLINE_BCRYPT_COST ?? 12) : 12,
    logLevel: values.TAUTLINE_LOG_LEVEL,
  };
}
