import type { EntityManager } from 'typeorm';
import {
  frictionStatistics,
  inclineMu,
  poolFrictionTests,
  type FrictionSample,
} from '../../shared/physics/frictionTest.ts';
import { fixtureTheory } from '../../shared/physics/fixtureTheory.ts';
import type {
  FrictionKind,
  FrictionSummary,
  FrictionTest,
  FrictionTestInput,
  FrictionTestPatch,
  FrictionTests,
} from '../../shared/schemas/frictionTest.ts';
import type { AppDeps } from '../appDeps.ts';
import { inTransaction } from '../database/inTransaction.ts';
import { updateVersioned } from '../database/updateVersioned.ts';
import { BuildUpRow } from '../entities/BuildUpRow.ts';
import { FrictionTestRow } from '../entities/FrictionTestRow.ts';
import { invalid, notFound } from '../http/problem.ts';
import { recordEvent, type Actor } from './recordEvent.ts';
import { requireFixture, touchFixture } from './touchFixture.ts';

/** A fixture's friction tests, oldest first, and what those of a kind say together for its seat. */
export async function listFrictionTests(deps: AppDeps, fixtureId: number): Promise<FrictionTests> {
  const { manager } = deps.dataSource;
  const fixture = await requireFixture(manager, fixtureId);
  const [rows, buildUp] = await Promise.all([
    manager.find(FrictionTestRow, { where: { fixtureId }, order: { testedOn: 'ASC', id: 'ASC' } }),
    manager.findOne(BuildUpRow, { where: { fixtureId }, order: { revision: 'DESC' } }),
  ]);
  const { friction } = fixtureTheory(fixture.spec, buildUp?.content ?? null, [], rows);
  return {
    items: rows.map(toFrictionTest),
    kinetic: summaryOf(friction.kinetic, rows, 'kinetic'),
    static: summaryOf(friction.static, rows, 'static'),
  };
}

/** @throws ProblemError 404, or 422 when no face of the fixture has the name */
export function addFrictionTest(
  deps: AppDeps,
  fixtureId: number,
  input: FrictionTestInput,
  actor: Actor,
): Promise<FrictionTest> {
  return inTransaction(deps.dataSource, async (manager) => {
    const now = deps.clock();
    await touchFixture(manager, fixtureId, now);
    const { spec } = await requireFixture(manager, fixtureId);
    const faces = spec.seat.faces.map((face) => face.name);
    if (input.face !== null && !faces.includes(input.face)) {
      throw invalid([
        { path: 'face', message: `must be one of ${faces.join(', ')}, or null for all` },
      ]);
    }
    const result = await manager.insert(FrictionTestRow, {
      ...input,
      ...{ fixtureId, excluded: false, excludedReason: null, version: 1 },
      ...{ createdAt: now, createdBy: actor.name },
    });
    const test = await findTest(manager, Number(result.identifiers[0]?.id));
    await recordEvent(manager, {
      actor,
      action: 'friction test added',
      objectType: 'friction test',
      objectId: test.id,
      fixtureId,
      summary: `${test.kind} μ ${test.mean.toFixed(3)} from ${test.n} readings`,
      after: input,
    });
    return test;
  });
}

/** Excludes a test from the seat's friction, or takes it back in, with a reason. */
export function changeFrictionTest(
  deps: AppDeps,
  id: number,
  { version, excluded, reason }: FrictionTestPatch,
  actor: Actor,
): Promise<FrictionTest> {
  return inTransaction(deps.dataSource, async (manager) => {
    const before = await findTest(manager, id);
    await touchFixture(manager, before.fixtureId, deps.clock());
    await updateVersioned<FrictionTestRow>(
      manager,
      FrictionTestRow,
      id,
      version,
      { excluded, excludedReason: excluded ? reason : null },
      toFrictionTest,
    );
    await recordEvent(manager, {
      actor,
      action: excluded ? 'friction test excluded' : 'friction test restored',
      objectType: 'friction test',
      objectId: id,
      fixtureId: before.fixtureId,
      summary: reason,
      before: { excluded: before.excluded, reason: before.excludedReason },
      after: { excluded, reason },
    });
    return findTest(manager, id);
  });
}

/**
 * The core's sample carries the gauge in an effective number of readings; a person is shown the
 * readings' own scatter and number, and the uncertainty of the mean beside them.
 */
function summaryOf(
  sample: FrictionSample | undefined,
  tests: FrictionTestRow[],
  kind: FrictionKind,
): FrictionSummary | null {
  const pooled = poolFrictionTests(tests.filter((test) => test.kind === kind));
  if (sample === undefined || pooled === null) return null;
  const { mean, sd, n } = sample;
  const uncertainty = n > 1 ? sd / Math.sqrt(n) : null;
  return { mean, sd: pooled.sd, n: pooled.n, uncertainty };
}

async function findTest(manager: EntityManager, id: number): Promise<FrictionTest> {
  const row = await manager.findOneBy(FrictionTestRow, { id });
  if (row === null) throw notFound('friction test');
  return toFrictionTest(row);
}

function toFrictionTest(row: FrictionTestRow): FrictionTest {
  const mu = row.readings.map(inclineMu);
  return {
    id: row.id,
    fixtureId: row.fixtureId,
    version: row.version,
    kind: row.kind,
    face: row.face,
    surfaces: row.surfaces,
    batch: row.batch,
    testedOn: row.testedOn,
    readings: row.readings,
    readingUncertainty: row.readingUncertainty,
    remark: row.remark,
    mu,
    ...frictionStatistics(mu),
    excluded: row.excluded,
    excludedReason: row.excludedReason,
    createdAt: row.createdAt.toISOString(),
    createdBy: row.createdBy,
  };
}
