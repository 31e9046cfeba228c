import { cholesky } from '../numeric/cholesky.ts';
import { fitLinear, type LinearFit, type LinearProblem } from './fitLinear.ts';
import type { SeparationKind } from './separation.ts';

const EPS = 1e-9;

/**
 * Separation of binary trials by any columns, exactly: with x_i signed so that a slip is + and a
 * hold −, is there a direction β with x_iᵀβ ≥ 0 for all trials, not all 0? None: the trials
 * overlap. All strictly positive: complete. Otherwise quasi.
 *
 * A converged plain fit whose last Newton step moves no trial's η is proof of overlap (along a
 * direction of separation every step moves some η by about 1). Else linear programming decides,
 * max Σt with x_iᵀβ ≥ t_i and 0 ≤ t_i ≤ 1; rows come in as long as they are not satisfied.
 *
 * @param plainFit - a plain maximum likelihood fit of the same problem, if at hand
 * @source Konis 2007 (linear programmes for separation); Albert & Anderson 1984, Biometrika 71:1
 */
export function linearSeparation(
  problem: LinearProblem,
  plainFit: LinearFit = fitLinear(problem, false),
): SeparationKind {
  if (plainFit.status === 'converged' && plainFit.lastMove < 1e-4) return 'none';
  const p = problem.columns;
  const chunk = 4 * p + 8;
  const waiting = signedRows(problem);
  const active = waiting.splice(0, chunk);
  for (;;) {
    const direction = bestDirection(active, p);
    if (direction === null) {
      // only Xβ = 0 satisfies these rows; if they span everything there is no direction at all
      if (waiting.length === 0 || spans(active, p)) return 'none';
      active.push(...waiting.splice(0, chunk));
      continue;
    }
    const unsatisfied = waiting
      .map((row, i) => ({ i, value: dot(row, direction) }))
      .filter(({ value }) => value <= EPS)
      .sort((x, y) => x.value - y.value)
      .slice(0, chunk)
      .map(({ i }) => i);
    if (unsatisfied.length === 0) {
      return active.every((row) => dot(row, direction) > EPS) ? 'complete' : 'quasi';
    }
    for (const i of unsatisfied.sort((x, y) => y - x)) active.push(...waiting.splice(i, 1));
  }
}

function spans(rows: readonly Float64Array[], p: number): boolean {
  const gram = new Float64Array(p * p);
  for (const row of rows) {
    for (let i = 0; i < p; i++) for (let j = 0; j < p; j++) gram[i * p + j] += row[i] * row[j];
  }
  return cholesky(gram, p, 1e-12) !== null;
}

function dot(x: Float64Array, y: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < x.length; i++) sum += x[i] * y[i];
  return sum;
}

/** Rows x_i of slips and −x_i of holds, columns scaled to 1, equal rows once. */
function signedRows({ columns, design, n, k }: LinearProblem): Float64Array[] {
  const scale = new Float64Array(columns);
  for (let i = 0; i < n.length; i++) {
    for (let j = 0; j < columns; j++) {
      scale[j] = Math.max(scale[j], Math.abs(design[i * columns + j]));
    }
  }
  const rows: Float64Array[] = [];
  for (let i = 0; i < n.length; i++) {
    const row = Float64Array.from({ length: columns }, (_, j) =>
      scale[j] > 0 ? design[i * columns + j] / scale[j] : 0,
    );
    if (k[i] > 0) rows.push(row);
    if (k[i] < n[i]) rows.push(row.map((x) => -x));
  }
  return rows;
}

/**
 * A direction β with x_iᵀβ ≥ 0 for all rows and as many strict as possible, or null when only
 * Xβ = 0 will do. Linear programme: max Σt, t_i − x_iᵀβ ≤ 0, t_i ≤ 1, t ≥ 0, β = β⁺ − β⁻.
 */
function bestDirection(rows: readonly Float64Array[], p: number): Float64Array | null {
  const m = rows.length;
  const width = 2 * p + m; // β⁺, β⁻, t
  const constraints = 2 * m;
  const stride = width + constraints + 1;
  const tableau = new Float64Array((constraints + 1) * stride);
  const basis = new Int32Array(constraints);
  rows.forEach((row, i) => {
    for (let j = 0; j < p; j++) {
      tableau[i * stride + j] = -row[j];
      tableau[i * stride + p + j] = row[j]!;
    }
    tableau[i * stride + 2 * p + i] = 1;
    tableau[i * stride + width + i] = 1;
    basis[i] = width + i;
    const cap = m + i;
    tableau[cap * stride + 2 * p + i] = 1;
    tableau[cap * stride + width + cap] = 1;
    tableau[cap * stride + stride - 1] = 1;
    basis[cap] = width + cap;
  });
  const objective = constraints * stride;
  for (let i = 0; i < m; i++) tableau[objective + 2 * p + i] = 1;
  for (let pivots = 0; pivots < 50 * (constraints + width); pivots++) {
    let enter = -1;
    for (let j = 0; j < stride - 1; j++) {
      if (tableau[objective + j] > EPS) {
        enter = j;
        break;
      }
    }
    if (enter < 0) break;
    let leave = -1;
    let ratio = Infinity;
    for (let i = 0; i < constraints; i++) {
      const x = tableau[i * stride + enter];
      if (x <= EPS) continue;
      const r = tableau[i * stride + stride - 1] / x;
      if (r < ratio - 1e-12 || (r < ratio + 1e-12 && basis[i] < basis[leave])) {
        ratio = Math.min(r, ratio);
        leave = i;
      }
    }
    if (leave < 0) break;
    pivot(tableau, stride, constraints + 1, leave, enter);
    basis[leave] = enter;
  }
  if (!(-tableau[objective + stride - 1] > EPS)) return null;
  const beta = new Float64Array(p);
  for (let i = 0; i < constraints; i++) {
    const at = basis[i];
    const value = tableau[i * stride + stride - 1];
    if (at < p) beta[at] += value;
    else if (at < 2 * p) beta[at - p] -= value;
  }
  return beta;
}

function pivot(t: Float64Array, stride: number, rows: number, row: number, column: number): void {
  const at = row * stride;
  const by = t[at + column];
  for (let j = 0; j < stride; j++) t[at + j] /= by;
  for (let i = 0; i < rows; i++) {
    const factor = t[i * stride + column];
    if (i === row || factor === 0) continue;
    for (let j = 0; j < stride; j++) t[i * stride + j] -= factor * t[at + j];
  }
}
