/**
 * A symmetric matrix with a diagonal block, a border of one or two rows and a small core: the
 * shape of the information of models with one intercept per group and a common slope.
 */
export interface Arrow {
  reps: number;
  globals: number;
  diagonal: Float64Array;
  /** `globals` rows of `reps`. */
  border: Float64Array;
  /** 2 × 2, of which `globals` × `globals` are used. */
  core: Float64Array;
}

export function createArrow(reps: number, globals: number): Arrow {
  return {
    reps,
    globals,
    diagonal: new Float64Array(reps),
    border: new Float64Array(2 * reps),
    core: new Float64Array(4),
  };
}

/**
 * Solves A x = rhs by eliminating the diagonal block; O(reps).
 *
 * @param x - receives the solution: reps, then globals
 * @returns false if A is not positive definite
 */
export function solveArrow(arrow: Arrow, rhs: Float64Array, x: Float64Array): boolean {
  const { reps, globals, diagonal, border, core } = arrow;
  let c00 = core[0];
  let c01 = core[1];
  let c11 = core[3];
  let r0 = globals > 0 ? rhs[reps] : 0;
  let r1 = globals > 1 ? rhs[reps + 1] : 0;
  const [full00, full11] = [c00, c11];
  for (let r = 0; r < reps; r++) {
    const d = diagonal[r];
    if (!(d > 0)) return false;
    if (globals === 0) continue;
    const b0 = border[r];
    const q = b0 / d;
    c00 -= q * b0;
    r0 -= q * rhs[r];
    if (globals > 1) {
      const b1 = border[reps + r];
      c01 -= q * b1;
      c11 -= (b1 * b1) / d;
      r1 -= (b1 / d) * rhs[r];
    }
  }
  let x0 = 0;
  let x1 = 0;
  if (globals === 1) {
    if (!(c00 > 1e-15 * Math.abs(full00))) return false;
    x0 = r0 / c00;
    x[reps] = x0;
  } else if (globals === 2) {
    if (!(c00 > 1e-15 * Math.abs(full00))) return false;
    const schur = c11 - (c01 * c01) / c00;
    if (!(schur > 1e-15 * Math.abs(full11))) return false;
    x1 = (r1 - (c01 / c00) * r0) / schur;
    x0 = (r0 - c01 * x1) / c00;
    x[reps] = x0;
    x[reps + 1] = x1;
  }
  for (let r = 0; r < reps; r++) {
    x[r] = (rhs[r] - border[r] * x0 - border[reps + r] * x1) / diagonal[r];
  }
  return true;
}
