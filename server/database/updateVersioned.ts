import type { EntityManager, EntityTarget, FindOptionsWhere } from 'typeorm';
import type { QueryDeepPartialEntity } from 'typeorm/query-builder/QueryPartialEntity.js';
import { conflict, notFound } from '../http/problem.ts';

type Versioned = { id: number; version: number };

/**
 * Changes a row only if it still has the version the caller saw, and raises the version by one.
 * `save()` would write a stale version back; this cannot.
 *
 * @param present - how the present row is shown to somebody who came too late
 * @returns the new version
 * @throws ProblemError 404 without such a row, 409 with the present state on a stale version
 */
export async function updateVersioned<Row extends Versioned>(
  manager: EntityManager,
  entity: EntityTarget<Row>,
  id: number,
  version: number,
  changes: QueryDeepPartialEntity<Row>,
  present: (row: Row) => unknown = () => undefined,
): Promise<number> {
  const where = { id, version } as FindOptionsWhere<Row>;
  const result = await manager.update(entity, where, {
    ...changes,
    version: version + 1,
  });
  if (result.affected === 1) return version + 1;
  const row = await manager.findOneBy(entity, { id } as FindOptionsWhere<Row>);
  if (row === null) throw notFound('record');
  throw conflict(
    `This was changed meanwhile: you worked on version ${version}, it is now ${row.version}. ` +
      'Reload and make your change again.',
    present(row),
  );
}
