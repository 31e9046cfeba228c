/** Lower factor of a symmetric positive definite matrix, row by row in one array. */
export interface Cholesky {
  size: number;
  lower: Float64Array;
  /** ln det of the matrix. */
  logDet: number;
}

/**
 * A = L Lᵀ. Returns null when a pivot falls to `tolerance` of its own diagonal element: the matrix
 * is singular as far as double precision can tell.
 *
 * @param a - size × size, row by row; only the lower triangle is read
 * @source Golub & Van Loan, Matrix Computations, 4th ed., algorithm 4.2.1
 */
export function cholesky(a: Float64Array, size: number, tolerance = 1e-14): Cholesky | null {
  const lower = new Float64Array(size * size);
  let logDet = 0;
  for (let j = 0; j < size; j++) {
    const row = j * size;
    let pivot = a[row + j];
    for (let k = 0; k < j; k++) pivot -= lower[row + k] ** 2;
    if (!(pivot > tolerance * Math.abs(a[row + j])) || pivot === Infinity) return null;
    const root = Math.sqrt(pivot);
    lower[row + j] = root;
    logDet += Math.log(pivot);
    for (let i = j + 1; i < size; i++) {
      let sum = a[i * size + j];
      for (let k = 0; k < j; k++) sum -= lower[i * size + k] * lower[row + k];
      lower[i * size + j] = sum / root;
    }
  }
  return { size, lower, logDet };
}

/** Solves A x = b in a new array. */
export function solveCholesky(factor: Cholesky, b: Float64Array): Float64Array {
  const { size, lower } = factor;
  const x = Float64Array.from(b);
  for (let i = 0; i < size; i++) {
    let sum = x[i];
    for (let k = 0; k < i; k++) sum -= lower[i * size + k] * x[k];
    x[i] = sum / lower[i * size + i];
  }
  for (let i = size - 1; i >= 0; i--) {
    let sum = x[i];
    for (let k = i + 1; k < size; k++) sum -= lower[k * size + i] * x[k];
    x[i] = sum / lower[i * size + i];
  }
  return x;
}

/** A⁻¹, row by row. */
export function invertCholesky(factor: Cholesky): Float64Array {
  const { size } = factor;
  const inverse = new Float64Array(size * size);
  for (let j = 0; j < size; j++) {
    const unit = new Float64Array(size);
    unit[j] = 1;
    const column = solveCholesky(factor, unit);
    for (let i = 0; i < size; i++) inverse[i * size + j] = column[i]!;
  }
  return inverse;
}
