import type { EntityManager } from 'typeorm';
import { FixtureRow } from '../entities/FixtureRow.ts';
import { notFound } from '../http/problem.ts';

/**
 * Says that something an analysis depends on is changing. First in every such transaction: it
 * also locks the fixture, so that two changes of one fixture take turns.
 *
 * @throws ProblemError 404 without such a fixture
 */
export async function touchFixture(manager: EntityManager, id: number, now: Date): Promise<void> {
  const result = await manager.update(
    FixtureRow,
    { id },
    { dataVersion: () => 'data_version + 1', updatedAt: now },
  );
  if (result.affected !== 1) throw notFound('fixture');
}

/** @throws ProblemError 404 without such a fixture */
export async function requireFixture(manager: EntityManager, id: number): Promise<FixtureRow> {
  const row = await manager.findOneBy(FixtureRow, { id });
  if (row === null) throw notFound('fixture');
  return row;
}
