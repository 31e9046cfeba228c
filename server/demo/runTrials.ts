import { fixtureTheory, type FixtureTheory } from '../../shared/physics/fixtureTheory.ts';
import { endMark, peakLag } from '../../shared/physics/slipMotion.ts';
import type { FrictionTestInput } from '../../shared/schemas/frictionTest.ts';
import type { Outcome } from '../../shared/schemas/trial.ts';
import type { DayPlan, FixturePlan } from './fixturePlan.ts';
import type { RandomSource } from './randomSource.ts';

/** A trial as the bench would note it; SI, position in mm. */
export type DemoTrial = {
  order: number;
  at: string;
  label: string;
  positionMm: number;
  acceleration: number;
  outcome: Outcome;
  slipAngle: number | null;
  seating: string | null;
  batch: string | null;
};

/** A part that should have slipped at far less is thrown off. */
const lostAbove = 1.32;

/**
 * Invents the trials of a fixture, day by day. Each trial draws the acceleration at which this
 * very move would slip: the fixture's own torque over inertia, at the true coefficient of
 * friction, with logistic scatter on its logarithm. What it does then follows from the table's
 * acceleration: held below, slipped above with the lag that physics gives, lost far above.
 */
export function runTrials(
  plan: FixturePlan,
  frictionTests: readonly FrictionTestInput[],
  random: RandomSource,
): { day: DayPlan; trials: DemoTrial[] }[] {
  const theory = fixtureTheory(plan.fixture, plan.buildUp, plan.configurations, frictionTests);
  const limits = trueLimits(plan, theory);
  // a fixture without friction tests is tried around what its maker said
  const planned = plan.friction.kinetic?.mean ?? plan.truth.mu;
  const { resolution, maxAcceleration } = plan.fixture.drive;

  const total = plan.days.reduce((sum, day) => sum + countOf(plan, day), 0);
  let order = 0;
  return plan.days.map((day) => {
    const labels = labelsOf(plan, day);
    const moves = random.shuffle(
      labels.flatMap((label) =>
        day.levels.flatMap((level) => Array<[string, number]>(day.repeats).fill([label, level])),
      ),
    );
    const start = Date.parse(`${day.day}T06:40:00Z`);
    const trials = moves.map(([label, level], index): DemoTrial => {
      order++;
      const limit = limits.get(label) ?? Number.NaN;
      const wanted =
        ((limit / plan.truth.mu) * planned * level) / (plan.truth.effects?.[label] ?? 1);
      const acceleration = Math.min(
        Math.max(1, Math.round(wanted / resolution)) * resolution,
        maxAcceleration,
      );
      const drift = (plan.truth.drift ?? 1) ** ((order - 1) / Math.max(1, total - 1));
      const own = limit * drift * Math.exp(random.logistic() / plan.truth.steepness);
      const position = plan.configurations.find((one) => one.label === label)?.positionMm ?? 0;
      const seating = plan.trialsPerSeating
        ? String(1 + Math.floor((order - 1) / plan.trialsPerSeating))
        : null;
      return {
        order,
        at: new Date(
          start + index * 95_000 + Math.floor(random.uniform() * 40) * 1000,
        ).toISOString(),
        label,
        positionMm: position,
        acceleration: Math.round(acceleration / resolution) * resolution,
        ...whatHappens(plan, theory.moveAngle, acceleration, own),
        seating,
        batch: day.batch ?? null,
      };
    });
    return { day, trials };
  });
}

/** Acceleration at which half the moves of each configuration slip, rad/s². */
function trueLimits({ truth }: FixturePlan, theory: FixtureTheory): Map<string, number> {
  return new Map(
    theory.configurations.map(({ label, inertia, torquePerMu }) => {
      if (inertia === null || torquePerMu === null) {
        throw new RangeError(`${label}: ${theory.notes.join(' ') || 'no theory'}`);
      }
      const effect = truth.effects?.[label] ?? 1;
      return [label, (effect * truth.mu * torquePerMu.value) / inertia];
    }),
  );
}

function whatHappens(
  { judgedBy }: FixturePlan,
  moveAngle: number,
  acceleration: number,
  own: number,
): { outcome: Outcome; slipAngle: number | null } {
  if (acceleration <= own) return { outcome: 'held', slipAngle: null };
  if (acceleration > lostAbove * own) return { outcome: 'lost', slipAngle: null };
  const seen = judgedBy === 'end mark' ? endMark : peakLag;
  return {
    outcome: 'slipped',
    slipAngle: judgedBy === 'by eye' ? null : seen(moveAngle, own / acceleration),
  };
}

function labelsOf(plan: FixturePlan, day: DayPlan): readonly string[] {
  return day.only ?? plan.configurations.map(({ label }) => label);
}

function countOf(plan: FixturePlan, day: DayPlan): number {
  return labelsOf(plan, day).length * day.levels.length * day.repeats;
}
