import { createDataSource } from './dataSource.ts';
import { readEnv } from './env.ts';
import { migrations } from './migrations/all.ts';

/** Runs the pending migrations; one runner at a time; refuses a schema newer than this build. */
async function main(): Promise<void> {
  const env = readEnv(process.env);
  if (env.migration === null) {
    throw new Error(
      'TAUTLINE_DB_MIGRATION_USER: migrations need an account that may change tables.',
    );
  }
  const dataSource = await createDataSource(env.migration, 2).initialize();
  const runner = dataSource.createQueryRunner();
  try {
    const [lock] = (await runner.query("SELECT GET_LOCK('tautline-migrate', 30) AS got")) as {
      got: number | string | null;
    }[];
    if (Number(lock?.got) !== 1) throw new Error('Another start is migrating the database.');
    await refuseUnknown((sql) => runner.query(sql));
    const done = await dataSource.runMigrations({ transaction: 'none' });
    for (const migration of done) console.log(`migrated: ${migration.name}`);
  } finally {
    await runner.release();
    await dataSource.destroy();
  }
}

async function refuseUnknown(query: (sql: string) => Promise<unknown>): Promise<void> {
  const tables = (await query("SHOW TABLES LIKE 'migrations'")) as unknown[];
  if (tables.length === 0) return;
  const known = new Set(migrations.map((migration) => new migration().name));
  for (const { name } of (await query('SELECT name FROM migrations')) as { name: string }[]) {
    if (!known.has(name)) {
      throw new Error(`The database was migrated by a newer version (${name}). Start that one.`);
    }
  }
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
