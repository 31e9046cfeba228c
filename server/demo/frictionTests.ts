import type {
  FrictionKind,
  FrictionTestInput,
  InclineReading,
} from '../../shared/schemas/frictionTest.ts';
import { fromRadians } from '../../shared/units/angle.ts';
import type { FixturePlan, FrictionPlan } from './fixturePlan.ts';
import type { RandomSource } from './randomSource.ts';

const baseMm = 300;

/** The incline tests of a plan, readings to half a millimetre or a tenth of a degree. */
export function frictionTests(plan: FixturePlan, random: RandomSource): FrictionTestInput[] {
  const batch = plan.days.find((day) => day.batch !== undefined)?.batch ?? null;
  return (['kinetic', 'static'] as const).flatMap((kind) => {
    const friction = plan.friction[kind];
    return friction ? [testOf(plan, kind, friction, batch, random)] : [];
  });
}

function testOf(
  { surfaces }: FixturePlan,
  kind: FrictionKind,
  { mean, sd, readings, by, testedOn }: FrictionPlan,
  batch: string | null,
  random: RandomSource,
): FrictionTestInput {
  const reading = (): InclineReading => {
    const mu = random.normal(mean, sd);
    return by === 'height'
      ? { heightMm: Math.round(mu * baseMm * 2) / 2, baseMm }
      : { angleDeg: Math.round(fromRadians(Math.atan(mu)) * 10) / 10 };
  };
  return {
    kind,
    face: null,
    surfaces,
    batch,
    testedOn,
    readings: Array.from({ length: readings }, reading),
    readingUncertainty: 0.003,
    remark: 'Demo data: invented readings.',
  };
}
