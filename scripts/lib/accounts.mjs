import { readFileSync } from 'node:fs';

const host = "'127.0.0.1'";
export const applicationUser = 'tautline_app';
export const migrationUser = 'tautline_migration';

/** The database and its two accounts: one changes tables, the other only their rows. */
export function accountsSql(database, passwords) {
  const migration = `'${migrationUser}'@${host}`;
  return `
    CREATE DATABASE IF NOT EXISTS \`${database}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci;
    CREATE USER IF NOT EXISTS ${migration} IDENTIFIED BY '${passwords.migration}';
    CREATE USER IF NOT EXISTS '${applicationUser}'@${host} IDENTIFIED BY '${passwords.application}';
    GRANT SELECT, INSERT, UPDATE, DELETE, CREATE, ALTER, DROP, INDEX, REFERENCES, TRIGGER
      ON \`${database}\`.* TO ${migration};`;
}

/**
 * What the application's account may do, table by table, from `server/migrations/grants.json`.
 * Tables are granted one by one: a grant on the whole database would defeat the append-only log.
 */
export function grantsSql(database, file = 'server/migrations/grants.json') {
  const grants = JSON.parse(readFileSync(file, 'utf8'));
  return Object.entries(grants)
    .map(
      ([table, rights]) =>
        `GRANT ${rights.join(', ')} ON \`${database}\`.\`${table}\` TO '${applicationUser}'@${host};`,
    )
    .join('\n');
}

/** The environment of a program that works on this database. */
export function databaseEnv(port, database, passwords) {
  return {
    TAUTLINE_DB_HOST: '127.0.0.1',
    TAUTLINE_DB_PORT: String(port),
    TAUTLINE_DB_NAME: database,
    TAUTLINE_DB_USER: applicationUser,
    TAUTLINE_DB_PASSWORD: passwords.application,
  };
}

export function migrationEnv(passwords) {
  return {
    TAUTLINE_DB_MIGRATION_USER: migrationUser,
    TAUTLINE_DB_MIGRATION_PASSWORD: passwords.migration,
  };
}
