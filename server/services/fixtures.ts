import type { EntityManager } from 'typeorm';
import type { Fixture, FixtureInput, FixturePatch } from '../../shared/schemas/fixture.ts';
import type { AppDeps } from '../appDeps.ts';
import { errorNumber, inTransaction } from '../database/inTransaction.ts';
import { updateVersioned } from '../database/updateVersioned.ts';
import { FixtureRow } from '../entities/FixtureRow.ts';
import { invalid } from '../http/problem.ts';
import { toFixture } from '../presenters/toFixture.ts';
import { differences } from './differences.ts';
import { recordEvent, type Actor } from './recordEvent.ts';
import { requireFixture } from './touchFixture.ts';

const duplicateKey = 1062;

export async function getFixture(deps: AppDeps, id: number): Promise<Fixture> {
  return toFixture(await requireFixture(deps.dataSource.manager, id));
}

/** @throws ProblemError 422 naming `code` when another fixture has it */
export function createFixture(deps: AppDeps, input: FixtureInput, actor: Actor): Promise<Fixture> {
  return inTransaction(deps.dataSource, async (manager) => {
    const now = deps.clock();
    const { code, name, line, status, remark, ...spec } = input;
    const result = await namingTheCode(
      manager.insert(FixtureRow, {
        ...{ code, name, line, status, remark, spec },
        ...{ version: 1, dataVersion: 1, createdAt: now, updatedAt: now },
      }),
    );
    const fixture = toFixture(await requireFixture(manager, Number(result.identifiers[0]?.id)));
    await recordEvent(manager, {
      actor,
      action: 'fixture created',
      objectType: 'fixture',
      objectId: fixture.id,
      fixtureId: fixture.id,
      summary: `Fixture ${code} was created`,
      after: input,
    });
    return fixture;
  });
}

/** @throws ProblemError 404, 409 with the present fixture on a stale version, 422 on a taken code */
export function changeFixture(
  deps: AppDeps,
  id: number,
  { version, ...patch }: FixturePatch,
  actor: Actor,
): Promise<Fixture> {
  return inTransaction(deps.dataSource, async (manager) => {
    const before = toFixture(await requireFixture(manager, id));
    const wanted = { ...before, ...withoutUndefined(patch) };
    const { code, name, line, status, remark, axis, move, drive, seat, hold } = wanted;
    await namingTheCode(
      updateVersioned<FixtureRow>(
        manager,
        FixtureRow,
        id,
        version,
        {
          ...{ code, name, line, status, remark, spec: { axis, move, drive, seat, hold } },
          dataVersion: () => 'data_version + 1',
          updatedAt: deps.clock(),
        },
        toFixture,
      ),
    );
    const after = toFixture(await requireFixture(manager, id));
    await recordFixtureChange(manager, before, after, actor);
    return after;
  });
}

async function recordFixtureChange(
  manager: EntityManager,
  before: Fixture,
  after: Fixture,
  actor: Actor,
): Promise<void> {
  const changed = differences(before, after, ['version', 'updatedAt']);
  const names = Object.keys(changed.after);
  await recordEvent(manager, {
    actor,
    action: 'fixture changed',
    objectType: 'fixture',
    objectId: after.id,
    fixtureId: after.id,
    summary: `Fixture ${after.code}: ${names.length === 0 ? 'nothing changed' : names.join(', ')}`,
    ...changed,
  });
}

async function namingTheCode<T>(work: Promise<T>): Promise<T> {
  try {
    return await work;
  } catch (error) {
    if (errorNumber(error) !== duplicateKey) throw error;
    throw invalid([{ path: 'code', message: 'is taken by another fixture; choose another one' }]);
  }
}

function withoutUndefined<T extends object>(value: T): Partial<T> {
  return Object.fromEntries(
    Object.entries(value).filter(([, field]) => field !== undefined),
  ) as Partial<T>;
}
