import type { BuildUp, BuildUpInput } from '../../shared/schemas/buildUp.ts';
import type { AppDeps } from '../appDeps.ts';
import { inTransaction } from '../database/inTransaction.ts';
import { updateVersioned } from '../database/updateVersioned.ts';
import { BuildUpRow } from '../entities/BuildUpRow.ts';
import { FixtureRow } from '../entities/FixtureRow.ts';
import { notFound } from '../http/problem.ts';
import { toBuildUp } from '../presenters/toBuildUp.ts';
import { toFixture } from '../presenters/toFixture.ts';
import { recordEvent, type Actor } from './recordEvent.ts';
import { requireFixture } from './touchFixture.ts';

/** Stores the next revision; analyses made on the one before keep theirs. */
export function reviseBuildUp(
  deps: AppDeps,
  fixtureId: number,
  { version, ...content }: BuildUpInput,
  actor: Actor,
): Promise<BuildUp> {
  return inTransaction(deps.dataSource, async (manager) => {
    const now = deps.clock();
    await updateVersioned<FixtureRow>(
      manager,
      FixtureRow,
      fixtureId,
      version,
      { dataVersion: () => 'data_version + 1', updatedAt: now },
      toFixture,
    );
    const before = await manager.findOne(BuildUpRow, {
      where: { fixtureId },
      order: { revision: 'DESC' },
    });
    const revision = (before?.revision ?? 0) + 1;
    await manager.insert(BuildUpRow, {
      ...{ fixtureId, revision, content, createdAt: now, createdBy: actor.name },
    });
    await recordEvent(manager, {
      actor,
      action: 'build-up revised',
      objectType: 'build-up',
      objectId: null,
      fixtureId,
      summary: `Build-up revision ${revision}`,
      before: before?.content ?? null,
      after: content,
    });
    const row = { fixtureId, revision, content, createdAt: now, createdBy: actor.name };
    return toBuildUp(row, { version: version + 1 }, revision);
  });
}

/**
 * One revision, the current one where none is named.
 *
 * @throws ProblemError 404 without the fixture, the build-up or the revision
 */
export async function getBuildUp(
  deps: AppDeps,
  fixtureId: number,
  revision?: number,
): Promise<BuildUp> {
  const all = await listBuildUps(deps, fixtureId);
  const wanted = revision === undefined ? all[0] : all.find((one) => one.revision === revision);
  if (wanted === undefined) throw notFound(revision === undefined ? 'build-up yet' : 'revision');
  return wanted;
}

/** Every revision, newest first. */
export async function listBuildUps(deps: AppDeps, fixtureId: number): Promise<BuildUp[]> {
  const { manager } = deps.dataSource;
  const fixture = await requireFixture(manager, fixtureId);
  const rows = await manager.find(BuildUpRow, {
    where: { fixtureId },
    order: { revision: 'DESC' },
  });
  return rows.map((row) => toBuildUp(row, fixture, rows[0]?.revision ?? 0));
}
