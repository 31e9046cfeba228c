import type { Body } from '../../../shared/schemas/buildUp.ts';
import type { ConfigurationInput } from '../../../shared/schemas/configuration.ts';
import type { FixtureInput } from '../../../shared/schemas/fixture.ts';
import type { FixturePlan, FrictionPlan } from '../fixturePlan.ts';

/** Every demo record says so. */
export const demoRemark = 'Demo data: this fixture, its maker and its trials are invented.';

export const verticalAxis: FixtureInput['axis'] = { tiltDeg: 0 };

/** Held by its own weight only; the mass is that of the build-up. */
export const weightOnly: FixtureInput['hold'] = {
  mass: null,
  verticalAcceleration: 0,
  clampForce: 0,
  springForce: 0,
  vacuum: null,
  eccentricityMm: 0,
};

/** Configurations named after their position. */
export function positions(...mm: number[]): ConfigurationInput[] {
  return mm.map((positionMm) => ({ label: `${positionMm} mm`, positionMm, measuredInertia: null }));
}

/** A body on the axis that does not move with the slide. */
export function fixed(name: string, shape: Body['shape'], mass: number, offsetMm = 0): Body {
  return { name, shape, mass, count: 1, placement: 'fixed', offsetMm };
}

/** A pair of equal masses that ride on the slide, opposite each other. */
export function slidingPair(name: string, radiusMm: number, mass: number): Body {
  return {
    name,
    shape: { kind: 'solid cylinder, axial', radiusMm },
    mass,
    count: 2,
    placement: 'slide',
    offsetMm: 0,
  };
}

/** Kinetic and static incline tests of one day, static the higher by `ratio`. */
export function friction(
  mean: number,
  {
    ratio = 1.2,
    spread = 0.035,
    readings = 8,
    by = 'height',
    testedOn,
  }: {
    ratio?: number;
    spread?: number;
    readings?: number;
    by?: FrictionPlan['by'];
    testedOn: string;
  },
): FixturePlan['friction'] {
  return {
    kinetic: { mean, sd: spread * mean, readings, by, testedOn },
    static: { mean: ratio * mean, sd: spread * ratio * mean, readings, by, testedOn },
  };
}

/** A full series about the expected boundary, as shares of the kinetic theory limit. */
export const fullSeries = [0.7, 0.8, 0.9, 0.98, 1.05, 1.12, 1.2, 1.32];

/** The same, closer to the boundary, for a second day. */
export const closeSeries = [0.86, 0.95, 1.02, 1.09, 1.16, 1.25];
