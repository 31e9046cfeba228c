import { randomBytes } from 'node:crypto';
import { inject } from 'vitest';
import type { DataSource } from 'typeorm';
import {
  accountsSql,
  applicationUser,
  grantsSql,
  migrationUser,
} from '../../scripts/lib/accounts.mjs';
import { sqlOver } from '../../scripts/lib/mariadb.mjs';
import { createDataSource } from '../../server/dataSource.ts';
import type { DatabaseSettings } from '../../server/env.ts';
import type { TestMariadb } from './databaseSetup.ts';

export type TestDatabase = {
  /** Open, with the application's account. */
  dataSource: DataSource;
  settings: DatabaseSettings;
  migration: DatabaseSettings;
  /** As the database's root. */
  sql: (text: string) => string;
  close: () => Promise<void>;
};

/** A fresh database with every migration and grant. */
export async function createTestDatabase(
  { port, socket, passwords }: TestMariadb = inject('mariadb'),
): Promise<TestDatabase> {
  const database = `t_${randomBytes(6).toString('hex')}`;
  const sql = (text: string) => sqlOver(socket, text);
  sql(accountsSql(database, passwords));
  const common = { host: '127.0.0.1', port, database };
  const migration = { ...common, user: migrationUser, password: passwords.migration };
  const settings = { ...common, user: applicationUser, password: passwords.application };
  const migrator = await createDataSource(migration, 1).initialize();
  await migrator.runMigrations({ transaction: 'none' });
  await migrator.destroy();
  sql(grantsSql(database));
  const dataSource = await createDataSource(settings).initialize();
  return {
    dataSource,
    settings,
    migration,
    sql: (text) => sql(`USE \`${database}\`; ${text}`),
    close: async () => {
      await dataSource.destroy();
      sql(`DROP DATABASE \`${database}\``);
    },
  };
}
