import type { EntityManager } from 'typeorm';
import { BuildUpRow } from '../entities/BuildUpRow.ts';
import { ConfigurationRow } from '../entities/ConfigurationRow.ts';
import type { FixtureRow } from '../entities/FixtureRow.ts';
import { FrictionTestRow } from '../entities/FrictionTestRow.ts';
import { TrialRow } from '../entities/TrialRow.ts';
import { requireFixture } from './touchFixture.ts';

/** Everything an analysis of a fixture rests on, as one snapshot. */
export type FixtureData = {
  fixture: FixtureRow;
  buildUp: BuildUpRow | null;
  /** In order of position. */
  configurations: ConfigurationRow[];
  tests: FrictionTestRow[];
  /** Not excluded, in order of id. */
  trials: TrialRow[];
  excluded: number;
};

/** @param manager - inside one transaction, so that the parts fit together */
export async function loadFixtureData(manager: EntityManager, id: number): Promise<FixtureData> {
  const fixture = await requireFixture(manager, id);
  const where = { fixtureId: id };
  return {
    fixture,
    buildUp: await manager.findOne(BuildUpRow, { where, order: { revision: 'DESC' } }),
    configurations: await manager.find(ConfigurationRow, {
      where,
      order: { positionMm: 'ASC', id: 'ASC' },
    }),
    tests: await manager.find(FrictionTestRow, { where, order: { id: 'ASC' } }),
    trials: await manager.find(TrialRow, {
      where: { ...where, excluded: false },
      order: { id: 'ASC' },
    }),
    excluded: await manager.countBy(TrialRow, { ...where, excluded: true }),
  };
}
