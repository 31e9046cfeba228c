import type { DataSource, EntityManager } from 'typeorm';
import { unavailable } from '../http/problem.ts';

/** Deadlock, lock wait, record changed since it was read: the whole unit may simply run again. */
const retryable = new Set([1213, 1205, 1020]);
const attempts = 4;

/**
 * Runs the work as one transaction: whole or absent. On a retryable error all of it is rolled
 * back and run again, at most three more times; outside effects belong after it.
 *
 * @throws ProblemError 503 when the database stays contended
 */
export async function inTransaction<T>(
  dataSource: DataSource,
  work: (manager: EntityManager) => Promise<T>,
): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await dataSource.transaction('REPEATABLE READ', work);
    } catch (error) {
      if (!retryable.has(errorNumber(error) ?? 0)) throw error;
      if (attempt === attempts)
        throw unavailable('Others are changing the same record. Try again.');
      await pause(attempt * 20 + Math.random() * 30);
    }
  }
}

/** MariaDB's number of an error, through TypeORM's wrapper; undefined for anything else. */
export function errorNumber(error: unknown): number | undefined {
  if (typeof error !== 'object' || error === null) return undefined;
  if ('errno' in error && typeof error.errno === 'number') return error.errno;
  return 'driverError' in error ? errorNumber(error.driverError) : undefined;
}

function pause(ms: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, ms));
}
