import type { EntityManager } from 'typeorm';
import { inertiaAt, inertiaPolynomial } from '../../shared/physics/inertiaPolynomial.ts';
import type {
  Configuration,
  ConfigurationInput,
  ConfigurationPatch,
} from '../../shared/schemas/configuration.ts';
import type { AppDeps } from '../appDeps.ts';
import { errorNumber, inTransaction } from '../database/inTransaction.ts';
import { updateVersioned } from '../database/updateVersioned.ts';
import { BuildUpRow } from '../entities/BuildUpRow.ts';
import { ConfigurationRow } from '../entities/ConfigurationRow.ts';
import { TrialRow } from '../entities/TrialRow.ts';
import { invalid, notFound } from '../http/problem.ts';
import { differences } from './differences.ts';
import { recordEvent, type Actor } from './recordEvent.ts';
import { requireFixture, touchFixture } from './touchFixture.ts';

const duplicateKey = 1062;

/** A fixture's configurations in order of position, each with the inertia in force. */
export async function listConfigurations(
  manager: EntityManager,
  fixtureId: number,
): Promise<Configuration[]> {
  await requireFixture(manager, fixtureId);
  const [rows, buildUp, counts] = await Promise.all([
    manager.find(ConfigurationRow, {
      where: { fixtureId },
      order: { positionMm: 'ASC', id: 'ASC' },
    }),
    manager.findOne(BuildUpRow, { where: { fixtureId }, order: { revision: 'DESC' } }),
    countTrials(manager, fixtureId),
  ]);
  return rows.map((row) => toConfiguration(row, buildUp, counts.get(row.id) ?? 0));
}

export function addConfiguration(
  deps: AppDeps,
  fixtureId: number,
  input: ConfigurationInput,
  actor: Actor,
): Promise<Configuration> {
  return inTransaction(deps.dataSource, async (manager) => {
    await touchFixture(manager, fixtureId, deps.clock());
    const id = await insertConfiguration(manager, fixtureId, input, actor);
    return findConfiguration(manager, fixtureId, id);
  });
}

/** Within a transaction that has touched the fixture. @returns the new row's id */
export async function insertConfiguration(
  manager: EntityManager,
  fixtureId: number,
  input: ConfigurationInput,
  actor: Actor,
): Promise<number> {
  const result = await namingTheLabel(
    manager.insert(ConfigurationRow, { ...input, fixtureId, version: 1 }),
  );
  const id = Number(result.identifiers[0]?.id);
  await recordEvent(manager, {
    actor,
    action: 'configuration added',
    objectType: 'configuration',
    objectId: id,
    fixtureId,
    summary: `Configuration ${input.label} at ${input.positionMm} mm`,
    after: input,
  });
  return id;
}

export function changeConfiguration(
  deps: AppDeps,
  id: number,
  { version, ...patch }: ConfigurationPatch,
  actor: Actor,
): Promise<Configuration> {
  return inTransaction(deps.dataSource, async (manager) => {
    const row = await manager.findOneBy(ConfigurationRow, { id });
    if (row === null) throw notFound('configuration');
    const { fixtureId } = row;
    await touchFixture(manager, fixtureId, deps.clock());
    const before = await findConfiguration(manager, fixtureId, id);
    const changes = Object.fromEntries(
      Object.entries(patch).filter(([, value]) => value !== undefined),
    );
    await namingTheLabel(
      updateVersioned<ConfigurationRow>(
        manager,
        ConfigurationRow,
        id,
        version,
        changes,
        () => before,
      ),
    );
    const after = await findConfiguration(manager, fixtureId, id);
    await recordEvent(manager, {
      actor,
      action: 'configuration changed',
      objectType: 'configuration',
      objectId: id,
      fixtureId,
      summary: `Configuration ${after.label}`,
      ...differences(before, after, ['version', 'computedInertia']),
    });
    return after;
  });
}

async function findConfiguration(
  manager: EntityManager,
  fixtureId: number,
  id: number,
): Promise<Configuration> {
  const found = (await listConfigurations(manager, fixtureId)).find((one) => one.id === id);
  if (found === undefined) throw notFound('configuration');
  return found;
}

function toConfiguration(
  row: ConfigurationRow,
  buildUp: BuildUpRow | null,
  trials: number,
): Configuration {
  const computed =
    buildUp === null ? null : inertiaAt(inertiaPolynomial(buildUp.content.bodies), row.positionMm);
  const computedInertia = computed !== null && computed > 0 ? computed : null;
  const { measuredInertia } = row;
  return {
    id: row.id,
    fixtureId: row.fixtureId,
    version: row.version,
    label: row.label,
    positionMm: row.positionMm,
    measuredInertia,
    computedInertia,
    inertia: measuredInertia?.value ?? computedInertia,
    inertiaRelativeUncertainty:
      measuredInertia?.relativeUncertainty ?? buildUp?.content.relativeUncertainty ?? 0,
    trials,
  };
}

async function countTrials(
  manager: EntityManager,
  fixtureId: number,
): Promise<Map<number, number>> {
  const rows = await manager
    .createQueryBuilder(TrialRow, 'trial')
    .select('trial.configurationId', 'id')
    .addSelect('COUNT(*)', 'trials')
    .where('trial.fixtureId = :fixtureId AND NOT trial.excluded', { fixtureId })
    .groupBy('trial.configurationId')
    .getRawMany<{ id: number; trials: string }>();
  return new Map(rows.map((row) => [row.id, Number(row.trials)]));
}

async function namingTheLabel<T>(work: Promise<T>): Promise<T> {
  try {
    return await work;
  } catch (error) {
    if (errorNumber(error) !== duplicateKey) throw error;
    throw invalid([
      { path: 'label', message: 'is taken by another configuration of this fixture' },
    ]);
  }
}
