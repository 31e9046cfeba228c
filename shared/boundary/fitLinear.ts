import { cholesky, invertCholesky, solveCholesky } from '../numeric/cholesky.ts';
import { createCellTerms, type LinkFunction } from './link.ts';

/** A binomial regression on any columns. */
export interface LinearProblem {
  /** Number of columns. */
  columns: number;
  /** Rows × columns, row by row. */
  design: Float64Array;
  n: Float64Array;
  k: Float64Array;
  link: LinkFunction;
}

/** β = origin + basis·γ, basis columns × free, row by row. */
export interface LinearConstraint {
  origin: Float64Array;
  basis: Float64Array;
  free: number;
}

export interface LinearFit {
  status: 'converged' | 'iterationLimit' | 'singular';
  beta: Float64Array;
  free: Float64Array;
  logLik: number;
  /** logLik + ½ ln det I(β), I the information of all columns. */
  penalisedLogLik: number;
  /** Objective that was maximised. */
  value: number;
  /** ∂ objective by every column's coefficient: the envelope derivative of a profile. */
  gradient: Float64Array;
  /** Inverse expected information of the unpenalised likelihood, null if singular. */
  covariance: Float64Array | null;
  iterations: number;
  /** Largest |Δη| of the last step. */
  lastMove: number;
}

/** Above this many columns Fisher scoring replaces the exact Hessian, whose cost grows as the fourth power. */
const EXACT_COLUMNS = 16;

/** No step moves any η further than this: where all is certain the curvature says nothing. */
const LONGEST = 8;

/** All coefficients free. */
export function freely(columns: number): LinearConstraint {
  const basis = new Float64Array(columns * columns);
  for (let j = 0; j < columns; j++) basis[j * columns + j] = 1;
  return { origin: new Float64Array(columns), basis, free: columns };
}

/** Coefficient `index` fixed at `value`. */
export function withCoefficient(columns: number, index: number, value: number): LinearConstraint {
  const origin = new Float64Array(columns);
  origin[index] = value;
  const free = columns - 1;
  const basis = new Float64Array(columns * free);
  for (let j = 0, f = 0; j < columns; j++) {
    if (j !== index) basis[j * free + f++] = 1;
  }
  return { origin, basis, free };
}

interface State {
  logLik: number;
  value: number;
  gradient: Float64Array;
  /** −∂² of the objective. */
  curvature: Float64Array;
  information: Float64Array;
  logDet: number;
}

/** Value, score and curvature at β by all columns. */
function evaluate(problem: LinearProblem, beta: Float64Array, penalised: boolean): State {
  const { columns: p, design, n, k, link } = problem;
  const rows = n.length;
  const eta = new Float64Array(rows);
  for (let i = 0, at = 0; i < rows; i++) {
    let sum = 0;
    for (let j = 0; j < p; j++, at++) sum += design[at] * beta[j];
    eta[i] = sum;
  }
  const terms = createCellTerms(rows);
  const logLik = link.terms(eta, n, k, terms);
  const gradient = new Float64Array(p);
  addRows(gradient, design, terms.score, p);
  const information = new Float64Array(p * p);
  addOuter(information, design, terms.w, p);
  const curvature = new Float64Array(p * p);
  addOuter(curvature, design, terms.curve, p);
  const factor = cholesky(information, p);
  const logDet = factor ? factor.logDet : -Infinity;
  const state = { logLik, value: logLik, gradient, curvature, information, logDet };
  if (!penalised) return state;
  state.value += 0.5 * logDet;
  if (!factor) return state;
  // ∂ ½ ln det I = ½ Σ h w′, with h the leverage of a row per unit of its weight
  const inverse = invertCholesky(factor);
  const pull = leverages(inverse, design, rows, p);
  const bend = Float64Array.from(pull, (h, i) => -0.5 * h * terms.w2[i]);
  for (let i = 0; i < rows; i++) pull[i] *= 0.5 * terms.w1[i];
  addRows(gradient, design, pull, p);
  if (p > EXACT_COLUMNS) {
    curvature.set(information);
    return state;
  }
  addOuter(curvature, design, bend, p);
  const turned: Float64Array[] = [];
  const weight = new Float64Array(rows);
  for (let j = 0; j < p; j++) {
    for (let i = 0; i < rows; i++) weight[i] = terms.w1[i] * design[i * p + j];
    const derivative = new Float64Array(p * p);
    addOuter(derivative, design, weight, p);
    turned.push(multiply(inverse, derivative, p));
  }
  for (let j = 0; j < p; j++) {
    for (let l = 0; l <= j; l++) {
      const half = 0.5 * traceOfProduct(turned[j], turned[l], p);
      curvature[j * p + l] += half;
      if (l !== j) curvature[l * p + j] += half;
    }
  }
  return state;
}

/** Σ w_i x_i. */
function addRows(into: Float64Array, design: Float64Array, w: Float64Array, p: number): void {
  for (let i = 0, at = 0; i < w.length; i++) {
    for (let j = 0; j < p; j++, at++) into[j] += w[i] * design[at];
  }
}

/** Σ w_i x_i x_iᵀ. */
function addOuter(into: Float64Array, design: Float64Array, w: Float64Array, p: number): void {
  for (let i = 0, at = 0; i < w.length; i++, at += p) {
    for (let j = 0; j < p; j++) {
      const x = w[i] * design[at + j];
      if (x === 0) continue;
      for (let l = 0; l <= j; l++) into[j * p + l] += x * design[at + l];
    }
  }
  for (let j = 0; j < p; j++) for (let l = 0; l < j; l++) into[l * p + j] = into[j * p + l];
}

/** x_iᵀ A x_i of every row. */
function leverages(a: Float64Array, design: Float64Array, rows: number, p: number): Float64Array {
  const result = new Float64Array(rows);
  for (let i = 0, at = 0; i < rows; i++, at += p) {
    let sum = 0;
    for (let j = 0; j < p; j++) {
      const x = design[at + j];
      let row = 0.5 * a[j * p + j] * x;
      for (let l = 0; l < j; l++) row += a[j * p + l] * design[at + l];
      sum += 2 * x * row;
    }
    result[i] = sum;
  }
  return result;
}

function multiply(a: Float64Array, b: Float64Array, p: number): Float64Array {
  const product = new Float64Array(p * p);
  for (let i = 0; i < p; i++) {
    for (let m = 0; m < p; m++) {
      const x = a[i * p + m];
      for (let j = 0; j < p; j++) product[i * p + j] += x * b[m * p + j];
    }
  }
  return product;
}

function traceOfProduct(a: Float64Array, b: Float64Array, p: number): number {
  let sum = 0;
  for (let i = 0; i < p; i++) for (let j = 0; j < p; j++) sum += a[i * p + j] * b[j * p + i];
  return sum;
}

/** Largest |Δη| over the rows that a step in the free parameters makes. */
function largestMove(problem: LinearProblem, c: LinearConstraint, step: Float64Array): number {
  const { columns: p, design, n } = problem;
  const move = new Float64Array(p);
  for (let j = 0; j < p; j++) {
    for (let f = 0; f < c.free; f++) move[j] += c.basis[j * c.free + f] * step[f];
  }
  let largest = 0;
  for (let i = 0; i < n.length; i++) {
    let eta = 0;
    for (let j = 0; j < p; j++) eta += design[i * p + j] * move[j];
    largest = Math.max(largest, Math.abs(eta));
  }
  return largest;
}

/** basisᵀ · matrix · basis. */
function project(matrix: Float64Array, { basis, free }: LinearConstraint, p: number): Float64Array {
  const half = new Float64Array(p * free);
  for (let i = 0; i < p; i++) {
    for (let m = 0; m < p; m++) {
      const x = matrix[i * p + m];
      if (x !== 0) for (let f = 0; f < free; f++) half[i * free + f] += x * basis[m * free + f];
    }
  }
  const result = new Float64Array(free * free);
  for (let i = 0; i < p; i++) {
    for (let e = 0; e < free; e++) {
      const x = basis[i * free + e];
      if (x !== 0) for (let f = 0; f < free; f++) result[e * free + f] += x * half[i * free + f];
    }
  }
  return result;
}

/**
 * Maximum (penalised) likelihood of a binomial regression under a linear constraint; the penalty
 * ½ ln det I is that of all columns. Damped Newton with the exact Hessian, Fisher scoring where
 * that is not positive definite. Plain maximum likelihood on separated data has no maximum: decide
 * with `linearSeparation` first.
 *
 * @param start - β to start from (projected by least squares onto the constraint is not needed:
 * give the free parameters)
 * @source Firth 1993, Biometrika 80:27; Heinze & Schemper 2002, Stat. Med. 21:2409
 */
export function fitLinear(
  problem: LinearProblem,
  penalised: boolean,
  constraint: LinearConstraint = freely(problem.columns),
  start: Float64Array = new Float64Array(constraint.free),
): LinearFit {
  const p = problem.columns;
  const { origin, basis, free } = constraint;
  const spread = (gamma: Float64Array) => {
    const beta = Float64Array.from(origin);
    for (let j = 0; j < p; j++) {
      for (let f = 0; f < free; f++) beta[j] += basis[j * free + f] * gamma[f];
    }
    return beta;
  };
  let gamma = Float64Array.from(start);
  let state = evaluate(problem, spread(gamma), penalised);
  let lastMove = Infinity;
  const finish = (status: LinearFit['status'], iterations: number): LinearFit => {
    const factor = cholesky(state.information, p);
    return {
      status,
      beta: spread(gamma),
      free: gamma,
      logLik: state.logLik,
      penalisedLogLik: state.logLik + 0.5 * state.logDet,
      value: state.value,
      gradient: state.gradient,
      covariance: factor ? invertCholesky(factor) : null,
      iterations,
      lastMove,
    };
  };
  if (!Number.isFinite(state.value)) return finish('singular', 0);
  if (free === 0) return finish('converged', 0);
  for (let iteration = 1; iteration <= 300; iteration++) {
    const gradient = new Float64Array(free);
    for (let j = 0; j < p; j++) {
      for (let f = 0; f < free; f++) gradient[f] += basis[j * free + f] * state.gradient[j];
    }
    const factor =
      cholesky(project(state.curvature, constraint, p), free) ??
      cholesky(project(state.information, constraint, p), free);
    if (!factor) return finish('singular', iteration);
    const step = solveCholesky(factor, gradient);
    let decrement = 0;
    for (let f = 0; f < free; f++) decrement += step[f] * gradient[f];
    lastMove = largestMove(problem, constraint, step);
    let accepted = false;
    for (let t = Math.min(1, LONGEST / lastMove); t > 1e-14; t /= 2) {
      const next = gamma.map((value, f) => value + t * step[f]);
      const there = evaluate(problem, spread(next), penalised);
      const gain = there.value - state.value;
      if (
        gain >= 1e-4 * t * decrement ||
        (decrement < 1e-9 && gain >= -1e-12 * Math.abs(state.value))
      ) {
        gamma = next;
        state = there;
        accepted = true;
        break;
      }
    }
    const small = decrement < 1e-20 * (1 + Math.abs(state.value));
    if (small) return finish('converged', iteration);
    if (!accepted) {
      return finish(
        decrement < 1e-9 * (1 + Math.abs(state.value)) ? 'converged' : 'iterationLimit',
        iteration,
      );
    }
  }
  return finish('iterationLimit', 300);
}
