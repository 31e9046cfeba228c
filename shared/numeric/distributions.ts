import betaCdf from '@stdlib/stats-base-dists-beta-cdf';
import betaQuantileOf from '@stdlib/stats-base-dists-beta-quantile';
import chiSquareQuantileOf from '@stdlib/stats-base-dists-chisquare-quantile';
import normalCdfOf from '@stdlib/stats-base-dists-normal-cdf';
import normalQuantileOf from '@stdlib/stats-base-dists-normal-quantile';
import tQuantileOf from '@stdlib/stats-base-dists-t-quantile';

/** Standard normal distribution function Φ(x). */
export function normalCdf(x: number): number {
  return normalCdfOf(x, 0, 1);
}

/**
 * Standard normal quantile Φ⁻¹(p), 0 < p < 1. The library's value loses digits in the lower tail
 * (it works with 1 − p), so two Newton steps on ln Φ follow there.
 */
export function normalQuantile(p: number): number {
  let x = normalQuantileOf(p, 0, 1);
  if (!(p > 0 && p < 0.1)) return x;
  if (x === -Infinity) x = -Math.sqrt(-2 * Math.log(p));
  for (let i = 0; i < 6; i++) {
    const cdf = normalCdf(x);
    const step = (Math.log(cdf / p) * cdf * Math.sqrt(2 * Math.PI)) / Math.exp(-0.5 * x * x);
    x -= step;
    if (Math.abs(step) < 1e-15 * Math.abs(x)) break;
  }
  return x;
}

/** Quantile of Student's t with `df` degrees of freedom. */
export function tQuantile(p: number, df: number): number {
  return tQuantileOf(p, df);
}

/** Quantile of the chi-square distribution with `df` degrees of freedom. */
export function chiSquareQuantile(p: number, df: number): number {
  return chiSquareQuantileOf(p, df);
}

/**
 * Upper tail P(χ²_df > x) for a whole number of degrees of freedom, exact in the far tail too:
 * Q₁ = 2Φ(−√x), Q₂ = e^{−x/2}, Q_{ν+2} = Q_ν + (x/2)^{ν/2} e^{−x/2} / Γ(ν/2 + 1).
 *
 * @source Abramowitz & Stegun 1964, 26.4.4, 26.4.5 and 26.4.8
 * @throws RangeError if df is not a whole number ≥ 1
 */
export function chiSquareUpper(x: number, df: number): number {
  if (!Number.isInteger(df) || df < 1) throw new RangeError('df must be a whole number from 1');
  if (!(x > 0)) return Number.isNaN(x) ? NaN : 1;
  const half = x / 2;
  const odd = df % 2 === 1;
  let upper = odd ? 2 * normalCdf(-Math.sqrt(x)) : Math.exp(-half);
  // (x/2)^{ν/2} e^{−x/2} / Γ(ν/2 + 1) at ν = 1 or 2, then by its recurrence
  let term = odd ? 2 * Math.sqrt(half / Math.PI) * Math.exp(-half) : half * Math.exp(-half);
  for (let nu = odd ? 1 : 2; nu < df; nu += 2) {
    upper += term;
    term *= half / (nu / 2 + 1);
  }
  return Math.min(1, upper);
}

/**
 * P(X ≥ k) for X binomial(n, p), by the incomplete beta function.
 *
 * @source Abramowitz & Stegun 1964, 26.5.24
 */
export function binomialUpper(k: number, n: number, p: number): number {
  if (k <= 0) return 1;
  if (k > n) return 0;
  return betaCdf(p, k, n - k + 1);
}

/**
 * One-sided upper Clopper–Pearson bound of a binomial probability; 1 when nothing was tried.
 *
 * @source Clopper & Pearson 1934, Biometrika 26:404
 */
export function clopperPearsonUpper(k: number, n: number, confidence: number): number {
  if (k >= n) return 1;
  if (k === 0) return -Math.expm1(Math.log1p(-confidence) / n);
  return betaQuantileOf(confidence, k + 1, n - k);
}

/**
 * One-sided lower Clopper–Pearson bound of a binomial probability; 0 when nothing happened.
 *
 * @source Clopper & Pearson 1934, Biometrika 26:404
 */
export function clopperPearsonLower(k: number, n: number, confidence: number): number {
  if (k <= 0) return 0;
  if (k === n) return Math.exp(Math.log1p(-confidence) / n);
  return betaQuantileOf(1 - confidence, k, n - k + 1);
}

/**
 * Fewest trials without a failure that demonstrate a reliability: the smallest n with Rⁿ ≤ 1 − C.
 *
 * @source common practice (success run), n = ln(1 − C) / ln R
 * @throws RangeError if confidence or reliability is not between 0 and 1
 */
export function successRun(confidence: number, reliability: number): number {
  if (!(confidence > 0 && confidence < 1))
    throw new RangeError('confidence must be between 0 and 1');
  if (!(reliability > 0 && reliability < 1))
    throw new RangeError('reliability must be between 0 and 1');
  const exact = Math.log1p(-confidence) / Math.log(reliability);
  return Math.ceil(exact * (1 - 1e-12));
}
