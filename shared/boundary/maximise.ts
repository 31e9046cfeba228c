import { cholesky, solveCholesky } from '../numeric/cholesky.ts';
import { createArrow, solveArrow, type Arrow } from './arrow.ts';
import type { CommonSlope, Penalty } from './commonSlope.ts';
import type { Constraint } from './constraint.ts';

export interface Maximum {
  status: 'converged' | 'iterationLimit' | 'singular';
  /** The objective at the maximum. */
  value: number;
  logLik: number;
  /** Free parameters: intercepts, slope, extra. */
  free: Float64Array;
  a: Float64Array;
  b: number;
  /** Derivative of the objective by each group's intercept: the envelope derivative of a profile. */
  gradA: Float64Array;
  iterations: number;
}

export interface MaximiseOptions {
  /** Stop when the Newton decrement gᵀN⁻¹g (twice the expected gain) is below this. */
  tolerance?: number;
  iterations?: number;
}

/** Spreads the free parameters over all groups' intercepts; returns the slope. */
function expand(constraint: Constraint, free: Float64Array, a: Float64Array): number {
  return spread(constraint, free, a, constraint.constant, constraint.fixedSlope);
}

/** The same for a step, which moves neither the constants nor a fixed slope. */
function expandStep(constraint: Constraint, step: Float64Array, a: Float64Array): number {
  return spread(constraint, step, a, null, constraint.fixedSlope === null ? null : 0);
}

function spread(
  { reps, rep, onSlope, onExtra, fixedSlope }: Constraint,
  free: Float64Array,
  a: Float64Array,
  constant: Float64Array | null,
  slope: number | null,
): number {
  const b = slope ?? free[reps];
  const extra = onExtra ? free[reps + (fixedSlope === null ? 1 : 0)] : 0;
  for (let g = 0; g < a.length; g++) {
    const r = rep[g];
    a[g] = (r < 0 ? 0 : free[r]) + onSlope[g] * b;
    if (constant) a[g] += constant[g];
    if (onExtra) a[g] += onExtra[g] * extra;
  }
  return b;
}

/** Projects a symmetric arrow (by a_g and b) onto the free parameters. */
function projectMatrix(
  c: Constraint,
  aa: Float64Array,
  ab: Float64Array,
  bb: number,
  into: Arrow,
): void {
  const { diagonal, border, core, reps } = into;
  diagonal.fill(0);
  border.fill(0);
  core.fill(0);
  const slopeFree = c.fixedSlope === null;
  if (slopeFree) core[0] = bb;
  for (let g = 0; g < aa.length; g++) {
    const r = c.rep[g];
    const d = aa[g];
    const s = c.onSlope[g];
    if (r >= 0) diagonal[r] += d;
    if (slopeFree) {
      const mixed = ab[g] + s * d;
      if (r >= 0) border[r] += mixed;
      core[0] += s * (ab[g] + mixed);
      if (c.onExtra) {
        const e = c.onExtra[g];
        if (r >= 0) border[reps + r] += e * d;
        core[1] += e * mixed;
        core[3] += e * e * d;
      }
    }
  }
}

function projectVector(c: Constraint, onA: Float64Array, onB: number, into: Float64Array): void {
  into.fill(0);
  const slopeFree = c.fixedSlope === null;
  if (slopeFree) into[c.reps] = onB;
  for (let g = 0; g < onA.length; g++) {
    const r = c.rep[g];
    if (r >= 0) into[r] += onA[g];
    if (slopeFree) {
      into[c.reps] += c.onSlope[g] * onA[g];
      if (c.onExtra) into[c.reps + 1] += c.onExtra[g] * onA[g];
    }
  }
}

/** No step moves any η further than this. */
const LONGEST = 8;

/** Up to this many free parameters a full factorisation is worth its cost. */
const DENSE = 40;

/** Solves (A + ½ v vᵀ) x = rhs by a full Cholesky factor; false if not positive definite. */
function solveDense(arrow: Arrow, v: Float64Array, rhs: Float64Array, x: Float64Array): boolean {
  const size = rhs.length;
  const { reps, globals, diagonal, border, core } = arrow;
  const matrix = new Float64Array(size * size);
  for (let r = 0; r < reps; r++) matrix[r * size + r] = diagonal[r];
  for (let e = 0; e < globals; e++) {
    const row = (reps + e) * size;
    for (let r = 0; r < reps; r++) matrix[row + r] = border[e * reps + r];
    for (let f = 0; f <= e; f++) matrix[row + reps + f] = e === f ? core[3 * e] : core[1];
  }
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) matrix[i * size + j] += 0.5 * v[i] * v[j];
  }
  const factor = cholesky(matrix, size);
  if (!factor) return false;
  x.set(solveCholesky(factor, rhs));
  return true;
}

function dot(x: Float64Array, y: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < x.length; i++) sum += x[i] * y[i];
  return sum;
}

/**
 * Maximises the (penalised) likelihood of a common-slope model under a linear constraint: damped
 * Newton with the exact Hessian, Fisher scoring where that is not positive definite, step halving.
 * Converged means that both the step and the score are negligible (the Newton decrement).
 *
 * @source Firth 1993 (modified score); Nocedal & Wright 2006, ch. 3 (damping)
 */
export function maximise(
  model: CommonSlope,
  constraint: Constraint,
  penalty: Penalty,
  start: Float64Array,
  options: MaximiseOptions = {},
): Maximum {
  const tolerance = options.tolerance ?? 1e-22;
  const limit = options.iterations ?? 200;
  const globals = (constraint.fixedSlope === null ? 1 : 0) + (constraint.onExtra ? 1 : 0);
  const dimension = constraint.reps + globals;
  const free = Float64Array.from(start);
  const trial = new Float64Array(dimension);
  const gradient = new Float64Array(dimension);
  const rank = new Float64Array(dimension);
  const step = new Float64Array(dimension);
  const solved = new Float64Array(dimension);
  const arrow = createArrow(constraint.reps, globals);
  const a = new Float64Array(model.groups);

  const evaluateAt = (point: Float64Array): number => {
    const b = expand(constraint, point, a);
    model.evaluate(a, b, penalty);
    return model.value;
  };
  const finish = (status: Maximum['status'], iterations: number, gain = 0): Maximum => {
    const b = expand(constraint, free, a);
    return {
      status,
      value: model.value + gain,
      logLik: model.logLik,
      free,
      a: Float64Array.from(a),
      b,
      gradA: Float64Array.from(model.gradA),
      iterations,
    };
  };

  let value = evaluateAt(free);
  if (!Number.isFinite(value)) return finish('singular', 0);
  if (dimension === 0) return finish('converged', 0);
  for (let iteration = 1; iteration <= limit; iteration++) {
    projectVector(constraint, model.gradA, model.gradB, gradient);
    projectMatrix(constraint, model.hessAA, model.hessAB, model.hessBB, arrow);
    projectVector(constraint, model.rankA, model.rankB, rank);
    let positive = solveArrow(arrow, gradient, step);
    if (positive && penalty === 'common') {
      // the rank-one part of the penalty's curvature, by Sherman & Morrison
      positive = solveArrow(arrow, rank, solved);
      const factor = (0.5 * dot(rank, step)) / (1 + 0.5 * dot(rank, solved));
      for (let i = 0; i < dimension; i++) step[i] -= factor * solved[i];
    } else if (penalty === 'common' && dimension <= DENSE) {
      // the whole can be positive definite although the arrow without its rank-one part is not
      positive = solveDense(arrow, rank, gradient, step);
    }
    let decrement = dot(gradient, step);
    if (!positive || !(decrement >= 0)) {
      projectMatrix(constraint, model.infoAA, model.infoAB, model.infoBB, arrow);
      if (!solveArrow(arrow, gradient, step)) return finish('singular', iteration);
      decrement = dot(gradient, step);
    }
    if (decrement < tolerance * (1 + Math.abs(value))) {
      for (let i = 0; i < dimension; i++) free[i] += step[i];
      return finish('converged', iteration, decrement / 2);
    }
    let accepted = false;
    // where all is certain the curvature says nothing about how far to go
    const slope = expandStep(constraint, step, a);
    const reach = model.reach(a, slope);
    for (let t = Math.min(1, LONGEST / reach); t > 1e-14; t /= 2) {
      for (let i = 0; i < dimension; i++) trial[i] = free[i] + t * step[i];
      const next = evaluateAt(trial);
      if (
        next >= value + 1e-4 * t * decrement ||
        (decrement < 1e-9 && next >= value - 1e-12 * Math.abs(value))
      ) {
        free.set(trial);
        value = next;
        accepted = true;
        break;
      }
    }
    if (!accepted) {
      evaluateAt(free);
      // rounding leaves no step that gains: the maximum is reached as far as double precision goes
      return finish(
        decrement < 1e-9 * (1 + Math.abs(value)) ? 'converged' : 'iterationLimit',
        iteration,
      );
    }
  }
  return finish('iterationLimit', limit);
}
