import type { Cells, Partition } from './cells.ts';
import { createCommonSlope, type CommonSlope, type Penalty } from './commonSlope.ts';
import { flat, unconstrained, type Constraint } from './constraint.ts';
import { bestMaximum } from './bestMaximum.ts';
import type { LinkFunction } from './link.ts';
import { maximise, type Maximum } from './maximise.ts';
import { mlSupremum, type Supremum } from './mlSupremum.ts';

/** A common-slope model with its penalised maximum, its unpenalised supremum and both at slope 0. */
export interface CommonSlopeFit {
  model: CommonSlope;
  penalised: Maximum;
  supremum: Supremum;
  /** Penalised and unpenalised maxima at slope 0, the limits of every profile at infinity. */
  flat: () => { penalised: number; logLik: number };
  /** At the penalised maximum. */
  information: Information;
}

/** Expected information of intercepts and slope, split: det I = Π S_g · Σ V_g. */
export interface Information {
  /** S_g = Σw. */
  weight: Float64Array;
  /** Weighted mean of z, per group. */
  mean: Float64Array;
  /** V_g = Σw(z − mean)². */
  spread: Float64Array;
}

/** Start: slope 0 and each free intercept at its share of slips. */
function flatStart(model: CommonSlope, constraint: Constraint): Float64Array {
  const slips = new Float64Array(constraint.reps);
  const trials = new Float64Array(constraint.reps);
  const { cells, groupOf } = model;
  for (let i = 0; i < cells.size; i++) {
    const r = constraint.rep[groupOf[cells.configuration[i]]];
    if (r < 0) continue;
    slips[r] += cells.k[i];
    trials[r] += cells.n[i];
  }
  const globals = (constraint.fixedSlope === null ? 1 : 0) + (constraint.onExtra ? 1 : 0);
  const start = new Float64Array(constraint.reps + globals);
  for (let r = 0; r < constraint.reps; r++) {
    start[r] = model.link.eta((slips[r] + 0.5) / (trials[r] + 1));
  }
  return start;
}

/** Expected information at (a, b). */
export function informationAt(model: CommonSlope, a: Float64Array, b: number): Information {
  const { cells, groupOf, groups, link } = model;
  const weight = new Float64Array(groups);
  const mean = new Float64Array(groups);
  const spread = new Float64Array(groups);
  const w = new Float64Array(cells.size);
  const out = new Float64Array(7);
  for (let i = 0; i < cells.size; i++) {
    const g = groupOf[cells.configuration[i]];
    link.at(a[g] + b * cells.z[i], out);
    w[i] = cells.n[i] * out[2] * out[3];
    weight[g] += w[i];
    mean[g] += w[i] * cells.z[i];
  }
  for (let g = 0; g < groups; g++) mean[g] /= weight[g];
  for (let i = 0; i < cells.size; i++) {
    const g = groupOf[cells.configuration[i]];
    spread[g] += w[i] * (cells.z[i] - mean[g]) ** 2;
  }
  return { weight, mean, spread };
}

/**
 * Slope over its standard error above which the penalised likelihood near an interval's ends is
 * taken to have one maximum: among 11,000 simulated ends (three links, 1 to 5 configurations)
 * several were seen up to 4.0 and never above.
 */
export const CLEAR_SLOPE = 5;

/**
 * Fits one intercept per group and a common slope, penalised and plain.
 *
 * @param near - a fit of the same trials with the same link to start from
 */
export function fitCommonSlope(
  cells: Cells,
  partition: Partition,
  link: LinkFunction,
  near?: CommonSlopeFit,
): CommonSlopeFit {
  const model = createCommonSlope(cells, partition, link);
  const constraint = unconstrained(model.groups);
  const start = flatStart(model, constraint);
  let level: { penalised: number; logLik: number } | undefined;
  const levelStart = start.subarray(0, model.groups);
  const from = Float64Array.from(start);
  if (near?.penalised.status === 'converged' && !near.model.careful) {
    from.fill(near.penalised.a[0]);
    from[model.groups] = near.penalised.b;
  }
  let penalised = maximise(model, constraint, 'common', from);
  const supremum = mlSupremum(
    model,
    constraint,
    penalised.status === 'converged' ? penalised.free : start,
  );
  let information = informationAt(model, penalised.a, penalised.b);
  const wald = penalised.b * Math.sqrt(information.spread.reduce((sum, v) => sum + v, 0));
  model.careful = !(penalised.status === 'converged' && supremum.b !== null && wald > CLEAR_SLOPE);
  if (model.careful) {
    penalised = bestMaximum(model, constraint, 'common', start);
    information = informationAt(model, penalised.a, penalised.b);
  }
  return {
    model,
    penalised,
    supremum,
    flat: () =>
      (level ??= {
        penalised: maximise(model, flat(model.groups), 'common', levelStart).value,
        logLik: mlSupremum(model, flat(model.groups), levelStart).logLik,
      }),
    information,
  };
}

/** Maximum of a constrained common-slope model under the penalty of the unconstrained one. */
export function maximiseUnder(
  model: CommonSlope,
  constraint: Constraint,
  penalty: Penalty,
): Maximum {
  return bestMaximum(model, constraint, penalty, flatStart(model, constraint));
}
