import type { BuildUpInput } from '../../shared/schemas/buildUp.ts';
import type { ConfigurationInput } from '../../shared/schemas/configuration.ts';
import type { FixtureInput } from '../../shared/schemas/fixture.ts';
import type { Judgement } from '../../shared/schemas/trial.ts';
import type { Dialect } from './writeLog.ts';

/** Friction as the bench finds it: incline readings scattered about a mean. */
export type FrictionPlan = {
  mean: number;
  sd: number;
  readings: number;
  /** How the incline was read. */
  by: 'height' | 'angle';
  testedOn: string;
};

/** Trials made on one day and written to one log. */
export type DayPlan = {
  /** ISO date. */
  day: string;
  /** Accelerations tried, as shares of the kinetic theory limit. */
  levels: readonly number[];
  /** Trials at each of them. */
  repeats: number;
  /** Labels tried; all configurations when left out. */
  only?: readonly string[];
  batch?: string;
  dialect: Dialect;
};

/** One invented fixture: what is entered, and the truth its trials are drawn from. */
export type FixturePlan = {
  seed: number;
  fixture: FixtureInput;
  buildUp: Omit<BuildUpInput, 'version'>;
  configurations: ConfigurationInput[];
  surfaces: string;
  friction: { kinetic: FrictionPlan | null; static: FrictionPlan | null };
  truth: {
    /** Coefficient at which half of the moves slip. */
    mu: number;
    /** Slope of logit P(slip) over ln α. */
    steepness: number;
    /** Holding torque of a configuration over what theory gives it; 1 when left out. */
    effects?: Readonly<Record<string, number>>;
    /** Holding torque at the end of the trials over that at their beginning. */
    drift?: number;
  };
  judgedBy: Judgement;
  /** Trials per seating; the part is taken off and put back between two seatings. */
  trialsPerSeating?: number;
  days: DayPlan[];
};
