import type { Page } from '../../shared/schemas/common.ts';
import type { Trial, TrialPatch, TrialQuery } from '../../shared/schemas/trial.ts';
import type { AppDeps } from '../appDeps.ts';
import { inTransaction } from '../database/inTransaction.ts';
import { updateVersioned } from '../database/updateVersioned.ts';
import { ConfigurationRow } from '../entities/ConfigurationRow.ts';
import { TrialRow } from '../entities/TrialRow.ts';
import { notFound } from '../http/problem.ts';
import { toTrial } from '../presenters/toTrial.ts';
import { recordEvent, type Actor } from './recordEvent.ts';
import { requireFixture, touchFixture } from './touchFixture.ts';

const columns = {
  id: 'trial.id',
  acceleration: 'trial.acceleration',
  configuration: 'configuration.positionMm',
  order: 'trial.order',
  outcome: 'trial.outcome',
} as const;

/** A page of a fixture's trials. */
export async function listTrials(
  deps: AppDeps,
  fixtureId: number,
  query: TrialQuery,
): Promise<Page<Trial>> {
  const { manager } = deps.dataSource;
  await requireFixture(manager, fixtureId);
  const { page, pageSize, sort } = query;
  const trials = manager
    .createQueryBuilder(TrialRow, 'trial')
    .innerJoinAndMapOne(
      'trial.configuration',
      ConfigurationRow,
      'configuration',
      'configuration.id = trial.configurationId',
    )
    .where('trial.fixtureId = :fixtureId', { fixtureId });
  const { configuration, outcome, excluded, log } = query;
  if (configuration !== undefined) {
    trials.andWhere('configuration.label = :configuration', { configuration });
  }
  if (outcome !== undefined) trials.andWhere('trial.outcome = :outcome', { outcome });
  if (excluded !== undefined) {
    trials.andWhere('trial.excluded = :excluded', { excluded: excluded === 'true' });
  }
  if (log !== undefined) trials.andWhere('trial.logId = :log', { log });
  const name = (sort.startsWith('-') ? sort.slice(1) : sort) as keyof typeof columns;
  const [rows, total] = await trials
    .orderBy(columns[name], sort.startsWith('-') ? 'DESC' : 'ASC')
    .addOrderBy('trial.id', 'ASC')
    .offset((page - 1) * pageSize)
    .limit(pageSize)
    .getManyAndCount();
  const items = rows.map((row) =>
    toTrial(row, (row as TrialRow & { configuration: ConfigurationRow }).configuration),
  );
  return { items, total, page, pageSize };
}

/** Excludes a trial, or takes it back in, with a reason. The trial itself stays. */
export function changeTrial(
  deps: AppDeps,
  id: number,
  { version, excluded, reason }: TrialPatch,
  actor: Actor,
): Promise<Trial> {
  return inTransaction(deps.dataSource, async (manager) => {
    const row = await manager.findOneBy(TrialRow, { id });
    if (row === null) throw notFound('trial');
    const configuration = await manager.findOneByOrFail(ConfigurationRow, {
      id: row.configurationId,
    });
    const now = deps.clock();
    await touchFixture(manager, row.fixtureId, now);
    await updateVersioned<TrialRow>(
      manager,
      TrialRow,
      id,
      version,
      {
        excluded,
        excludedReason: excluded ? reason : null,
        excludedBy: excluded ? actor.name : null,
        excludedAt: excluded ? now : null,
      },
      (present) => toTrial(present, configuration),
    );
    await recordEvent(manager, {
      actor,
      action: excluded ? 'trial excluded' : 'trial restored',
      objectType: 'trial',
      objectId: id,
      fixtureId: row.fixtureId,
      summary: `${configuration.label}, ${row.outcome} at ${row.acceleration} rad/s²: ${reason}`,
      before: { excluded: row.excluded, reason: row.excludedReason },
      after: { excluded, reason },
    });
    return toTrial(await manager.findOneByOrFail(TrialRow, { id }), configuration);
  });
}
