import 'reflect-metadata';
import { DataSource } from 'typeorm';
import { AnalysisRow } from './entities/AnalysisRow.ts';
import { BoundaryCacheRow } from './entities/BoundaryCacheRow.ts';
import { BuildUpRow } from './entities/BuildUpRow.ts';
import { ConfigurationRow } from './entities/ConfigurationRow.ts';
import { EventRow } from './entities/EventRow.ts';
import { FixtureRow } from './entities/FixtureRow.ts';
import { FrictionTestRow } from './entities/FrictionTestRow.ts';
import { TrialLogRow } from './entities/TrialLogRow.ts';
import { TrialRow } from './entities/TrialRow.ts';
import { User } from './entities/User.ts';
import { UserSession } from './entities/UserSession.ts';
import type { DatabaseSettings } from './env.ts';
import { migrations } from './migrations/all.ts';

export const poolSize = 10;

type Field = { type: string; string(): string | null };

/** mysql2 adds up a double digit by digit and loses the last ones; Number() reads it exactly. */
function exactDoubles(field: Field, next: () => unknown): unknown {
  if (field.type !== 'DOUBLE') return next();
  const text = field.string();
  return text === null ? null : Number(text);
}

/**
 * The one data source. Every connection starts with UTC, strict mode, snapshot isolation that
 * reports lost updates (error 1020), and a limit on the time of a statement.
 */
export function createDataSource(database: DatabaseSettings, size = poolSize): DataSource {
  return new DataSource({
    type: 'mariadb',
    host: database.host,
    port: database.port,
    username: database.user,
    password: database.password,
    database: database.database,
    charset: 'utf8mb4_unicode_ci',
    timezone: 'Z',
    entities: [
      User,
      UserSession,
      EventRow,
      FixtureRow,
      BuildUpRow,
      ConfigurationRow,
      FrictionTestRow,
      TrialLogRow,
      TrialRow,
      AnalysisRow,
      BoundaryCacheRow,
    ],
    migrations,
    migrationsTransactionMode: 'none',
    invalidWhereValuesBehavior: { null: 'throw', undefined: 'throw' },
    connectTimeout: 2500,
    poolSize: size,
    extra: { resetOnRelease: true, idleTimeout: 60_000, typeCast: exactDoubles },
  });
}
