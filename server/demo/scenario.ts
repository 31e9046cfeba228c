import type { BuildUpInput } from '../../shared/schemas/buildUp.ts';
import type { ConfigurationInput } from '../../shared/schemas/configuration.ts';
import type { FixtureInput } from '../../shared/schemas/fixture.ts';
import type { FrictionTestInput } from '../../shared/schemas/frictionTest.ts';
import type { FixturePlan } from './fixturePlan.ts';
import { frictionTests } from './frictionTests.ts';
import {
  bowlCarrier,
  couplingNest,
  coverTurner,
  flangeTilter,
  nozzleCarrier,
  spoolTurner,
} from './plans/assembly.ts';
import { hubClamp, impellerSpinner, wheelCarrier } from './plans/impellers.ts';
import { elbowTurner, housingFlipper, housingIndexer, leaningTable } from './plans/pumpHousings.ts';
import { clackCarrier, turnoverTable, vacuumNest } from './plans/valveBodies.ts';
import { randomSource } from './randomSource.ts';
import { runTrials } from './runTrials.ts';
import { writeLog } from './writeLog.ts';

/** A log as it would be uploaded; the bytes are the UTF-8 of `text`. */
type DemoLog = {
  fileName: string;
  text: string;
  /** ISO 8601 UTC. */
  uploadedAt: string;
};

/** One fixture of the demo, as wire inputs, and its logs from the oldest to the newest. */
export type DemoFixture = {
  fixture: FixtureInput;
  /** `version` is the fixture's when it is stored. */
  buildUp: Omit<BuildUpInput, 'version'>;
  configurations: ConfigurationInput[];
  frictionTests: FrictionTestInput[];
  logs: DemoLog[];
};

const plans: FixturePlan[] = [
  turnoverTable,
  vacuumNest,
  clackCarrier,
  housingIndexer,
  elbowTurner,
  housingFlipper,
  leaningTable,
  impellerSpinner,
  hubClamp,
  wheelCarrier,
  spoolTurner,
  coverTurner,
  flangeTilter,
  nozzleCarrier,
  bowlCarrier,
  couplingNest,
];

/**
 * The demo scenario: an invented maker of pump and valve parts with four lines. Everything in it
 * is made up, from seeds, so every call gives the same fixtures, tests and logs. To seed, store
 * each fixture, then its build-up, configurations and friction tests, then upload its logs in
 * order; no log needs a mapping. `messyLog()` is left for the person who tries the upload.
 */
export function demoScenario(): DemoFixture[] {
  return plans.map(demoFixture);
}

function demoFixture(plan: FixturePlan): DemoFixture {
  const tests = frictionTests(plan, randomSource(plan.seed));
  const days = runTrials(plan, tests, randomSource(plan.seed + 1));
  return {
    fixture: plan.fixture,
    buildUp: plan.buildUp,
    configurations: plan.configurations,
    frictionTests: tests,
    logs: days.map(({ day, trials }) => ({
      fileName: `${plan.fixture.code}_${day.day}.csv`,
      text: writeLog(trials, plan.judgedBy, day.dialect),
      uploadedAt: `${day.day}T14:05:00Z`,
    })),
  };
}
