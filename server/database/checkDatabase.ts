import type { DataSource } from 'typeorm';

type Setting = { name: string; value: string };

/**
 * Refuses a database that would bend or lose what it is given: values are never cut to fit,
 * text is utf8mb4, times are UTC, and an acknowledged commit is on the disk.
 *
 * @throws Error that names the setting
 */
export async function checkDatabase(
  dataSource: DataSource,
  mode: 'development' | 'test' | 'production',
): Promise<void> {
  const rows = await dataSource.query<Setting[]>(
    `SELECT 'sql_mode' AS name, @@sql_mode AS value
     UNION ALL SELECT 'character_set_connection', @@character_set_connection
     UNION ALL SELECT 'time_zone', @@time_zone
     UNION ALL SELECT 'innodb_flush_log_at_trx_commit', @@innodb_flush_log_at_trx_commit`,
  );
  const settings = new Map(rows.map((row) => [row.name, String(row.value)]));
  require(settings, 'sql_mode', (value) => value.includes('STRICT_'));
  require(settings, 'character_set_connection', (value) => value === 'utf8mb4');
  require(settings, 'time_zone', (value) => value === '+00:00' || value === 'UTC');
  if (mode === 'production') {
    require(settings, 'innodb_flush_log_at_trx_commit', (value) => value === '1');
  }
}

function require(
  settings: Map<string, string>,
  name: string,
  fits: (value: string) => boolean,
): void {
  const value = settings.get(name) ?? '';
  if (!fits(value)) throw new Error(`The database's ${name} is '${value}': refusing to start.`);
}
