import type { ModelFit } from '../schemas/analysis.ts';
import type { Information } from './fitCommonSlope.ts';

/** Finite, or null: nothing else leaves the core. */
export function finite(value: number | null | undefined): number | null {
  return value !== null && value !== undefined && Number.isFinite(value) ? value : null;
}

/** Small-sample Akaike criterion of p coefficients and n trials; null where n leaves no room. */
export function aicc(logLik: number, p: number, n: number): number | null {
  const room = n - p - 1;
  return room > 0 ? finite(-2 * logLik + 2 * p + (2 * p * (p + 1)) / room) : null;
}

/**
 * Covariance of one intercept per group and the slope, on columns where group g's predictor is
 * z − shift[g]: the inverse of an arrow-shaped information in closed form.
 */
export function arrowCovariance(information: Information, shift: readonly number[]): number[][] {
  const { weight, mean, spread } = information;
  const slope = 1 / spread.reduce((sum, v) => sum + v, 0);
  const m = [...mean].map((value, g) => value - shift[g]);
  const rows = m.map((own, g) => [
    ...m.map((other, h) => own * other * slope + (g === h ? 1 / weight[g] : 0)),
    -own * slope,
  ]);
  return [...rows, [...m.map((own) => -own * slope), slope]];
}

/** A model that has no estimates, and why. */
export function unfitted(status: ModelFit['status'], names: readonly string[]): ModelFit {
  return {
    status,
    coefficients: names.map((name) => ({ name, estimate: null, se: null })),
    covariance: names.map(() => names.map(() => null)),
    logLik: null,
    penalisedLogLik: null,
    aicc: null,
  };
}

/** The wire form of a fitted model. */
export function modelFit(
  status: ModelFit['status'],
  names: readonly string[],
  estimates: ArrayLike<number>,
  covariance: readonly (readonly number[])[],
  logLik: number,
  penalisedLogLik: number,
  trials: number,
): ModelFit {
  return {
    status,
    coefficients: names.map((name, i) => ({
      name,
      estimate: finite(estimates[i]),
      se: finite(Math.sqrt(covariance[i]?.[i] ?? NaN)),
    })),
    covariance: names.map((_, i) => names.map((__, j) => finite(covariance[i]?.[j]))),
    logLik: finite(logLik),
    penalisedLogLik: finite(penalisedLogLik),
    aicc: aicc(logLik, names.length, trials),
  };
}
