import type { BoundaryData } from './collect.ts';
import { findEnd } from './findEnd.ts';
import { CLEAR_SLOPE } from './fitCommonSlope.ts';
import {
  fitLinear,
  withCoefficient,
  type LinearConstraint,
  type LinearFit,
  type LinearProblem,
} from './fitLinear.ts';
import type { LinkFunction } from './link.ts';
import { linearProfile } from './linearProfile.ts';
import { linearSeparation } from './linearSeparation.ts';
import { NO_SLOPE, type Absence } from './profileInterval.ts';
import type { SeparationKind } from './separation.ts';

/** logit P = b₀ + b·ln α + b₂·ln J, fitted as a + b·z + c·(ln J − mean) with b₂ = b + c. */
export interface PowerModel {
  problem: LinearProblem;
  fit: LinearFit;
  separation: SeparationKind;
  /** Coefficients intercept, lnAcceleration, lnInertia in their own scale. */
  natural: Float64Array;
  covariance: Float64Array | null;
  meanLnInertia: number;
}

const COLUMNS = 3;

/** Fits the power model; singular when all configurations share one inertia. */
export function fitPower(data: BoundaryData, link: LinkFunction, penalised: boolean): PowerModel {
  const { cells, centre, configurations } = data;
  const lnJ = configurations.map((c) => Math.log(c.equivalentInertia));
  const meanLnInertia = lnJ.reduce((sum, value) => sum + value, 0) / lnJ.length;
  const design = new Float64Array(COLUMNS * cells.size);
  for (let i = 0; i < cells.size; i++) {
    design[3 * i] = 1;
    design[3 * i + 1] = cells.z[i]!;
    design[3 * i + 2] = lnJ[cells.configuration[i]] - meanLnInertia;
  }
  const problem: LinearProblem = { columns: COLUMNS, design, n: cells.n, k: cells.k, link };
  const fit = fitLinear(problem, penalised);
  const separation = penalised ? 'none' : linearSeparation(problem, fit);
  const [a, b, c] = [fit.beta[0], fit.beta[1], fit.beta[2]];
  // rows: intercept = a − b·centre − c·mean, lnAcceleration = b, lnInertia = b + c
  const turn = [1, -centre, -meanLnInertia, 0, 1, 0, 0, 1, 1];
  const natural = Float64Array.from([a - b * centre - c * meanLnInertia, b, b + c]);
  const covariance = fit.covariance ? sandwich(turn, fit.covariance) : null;
  return { problem, fit, separation, natural, covariance, meanLnInertia };
}

function sandwich(t: readonly number[], covariance: Float64Array): Float64Array {
  const result = new Float64Array(9);
  for (let i = 0; i < 3; i++) {
    for (let j = 0; j < 3; j++) {
      let sum = 0;
      for (let k = 0; k < 3; k++) {
        for (let l = 0; l < 3; l++) sum += t[3 * i + k] * covariance[3 * k + l] * t[3 * j + l];
      }
      result[3 * i + j] = sum;
    }
  }
  return result;
}

/** Exponent fixed at k: c = b·(k − 1), still linear in (a, b). */
export function exponentAt(k: number): LinearConstraint {
  return {
    origin: new Float64Array(COLUMNS),
    basis: Float64Array.from([1, 0, 0, 1, 0, k - 1]),
    free: 2,
  };
}

/** The power model's exponent k = b₂/b with its profile interval; theory says 1. */
export function exponentInterval(
  power: PowerModel,
  penalised: boolean,
  crit: number,
): {
  estimate: number | null;
  lower: number | null;
  upper: number | null;
  absence: Absence | null;
} {
  const { problem, fit, separation } = power;
  const none = { estimate: null, lower: null, upper: null };
  if (fit.status !== 'converged') return { ...none, absence: 'not fitted' };
  if (!penalised && separation !== 'none') return { ...none, absence: 'separated' };
  const b = fit.beta[1];
  if (!(b > NO_SLOPE)) return { ...none, absence: 'falling' };
  const estimate = 1 + fit.beta[2] / b;
  const clear = b / Math.sqrt(fit.covariance![4]) > CLEAR_SLOPE;
  const profile = linearProfile(problem, fit, penalised, {
    constraintAt: exponentAt,
    starts: (clear ? [1] : [1, -1, 0.2, 3]).map((factor) =>
      Float64Array.from([fit.beta[0], factor * b]),
    ),
    slopeOf: (there) => there.beta[1] * there.gradient[2],
  });
  const level = fitLinear(problem, penalised, withCoefficient(COLUMNS, 1, 0));
  // first-order variance of (b + c)/b
  const [bb, bc, cc] = [fit.covariance![4], fit.covariance![5], fit.covariance![8]];
  const ratio = estimate - 1;
  const variance = (cc - 2 * ratio * bc + ratio * ratio * bb) / (b * b);
  const scale = Math.sqrt(crit * Math.max(variance, 1e-12));
  const bumpy = clear ? null : ([estimate - 4 * scale, estimate + 4 * scale] as const);
  const search = { from: estimate, crit, scale, bumpy };
  const absent = 2 * (fit.value - level.value) <= crit;
  return {
    estimate: absent ? null : estimate,
    lower: findEnd([profile], { ...search, direction: -1 }),
    upper: findEnd([profile], { ...search, direction: 1 }),
    absence: absent ? 'flat' : null,
  };
}

/** The scaled model inside the power model (exponent 1), under the power model's penalty. */
export function scaledInPower(power: PowerModel, penalised: boolean): LinearFit {
  return fitLinear(power.problem, penalised, exponentAt(1));
}
