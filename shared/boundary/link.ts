import type { Link } from '../schemas/analysis.ts';
import { normalCdf, normalQuantile } from '../numeric/distributions.ts';

/**
 * What a link says at one linear predictor η, with P the probability of a slip and Q = 1 − P:
 * the working weight per trial is r₁r₀, the score of a slip r₁ and of a hold −r₀.
 *
 * Places in the array that `at` fills: ln P, ln Q, r₁ = P′/P, r₀ = P′/Q, g₁ = d ln r₁/dη,
 * g₀ = d ln r₀/dη, and d(g₁ + g₀)/dη.
 */
export interface LinkFunction {
  name: Link;
  /** η at which P = p. */
  eta: (p: number) => number;
  at: (eta: number, out: Float64Array) => void;
  /**
   * The same for many cells of n trials and k slips at once.
   *
   * @returns Σ log-likelihood
   */
  terms: (eta: Float64Array, n: Float64Array, k: Float64Array, into: CellTerms) => number;
}

/** Per cell: score and curvature −∂² of the log-likelihood, weight w and its two derivatives by η. */
export interface CellTerms {
  score: Float64Array;
  curve: Float64Array;
  w: Float64Array;
  w1: Float64Array;
  w2: Float64Array;
}

export function createCellTerms(size: number): CellTerms {
  const array = () => new Float64Array(size);
  return { score: array(), curve: array(), w: array(), w1: array(), w2: array() };
}

/** `terms` of any link by its `at`. */
function termsBy(at: LinkFunction['at']): LinkFunction['terms'] {
  const out = new Float64Array(7);
  return (eta, n, k, { score, curve, w, w1, w2 }) => {
    let logLik = 0;
    for (let i = 0; i < n.length; i++) {
      at(eta[i], out);
      const slips = k[i];
      const holds = n[i] - slips;
      const [r1, r0, g1, g0] = [out[2], out[3], out[4], out[5]];
      if (slips > 0) logLik += slips * out[0];
      if (holds > 0) logLik += holds * out[1];
      score[i] = slips * r1 - holds * r0;
      curve[i] = holds * r0 * g0 - slips * r1 * g1;
      const weight = n[i] * r1 * r0;
      const u = g1 + g0;
      w[i] = weight;
      w1[i] = weight * u;
      w2[i] = weight * (u * u + out[6]);
    }
    return logLik;
  };
}

const logit: LinkFunction = {
  name: 'logit',
  eta: (p) => Math.log(p) - Math.log1p(-p),
  at(eta, out) {
    const e = Math.exp(-Math.abs(eta));
    const log = Math.log1p(e);
    const large = 1 / (1 + e);
    const small = e * large;
    const p = eta > 0 ? large : small;
    const q = eta > 0 ? small : large;
    out[0] = eta > 0 ? -log : eta - log;
    out[1] = eta > 0 ? -eta - log : -log;
    out[2] = q;
    out[3] = p;
    out[4] = -p;
    out[5] = q;
    out[6] = -2 * p * q;
  },
  // written out, because nearly all of an analysis is spent here
  terms(eta, n, k, { score, curve, w, w1, w2 }) {
    let logLik = 0;
    // Σ n ln(1 + e) as the logarithm of a product, taken before it can overflow
    let product = 1;
    for (let i = 0; i < n.length; i++) {
      const x = eta[i];
      const trials = n[i];
      const slips = k[i];
      const e = Math.exp(x > 0 ? -x : x);
      const sum = 1 + e;
      const large = 1 / sum;
      const small = e * large;
      const p = x > 0 ? large : small;
      const q = x > 0 ? small : large;
      const pq = large * small;
      logLik += x > 0 ? (slips - trials) * x : slips * x;
      if (trials === 1) product *= sum;
      else logLik -= trials * Math.log(sum);
      if (product > 1e200) {
        logLik -= Math.log(product);
        product = 1;
      }
      score[i] = slips * q - (trials - slips) * p;
      const weight = trials * pq;
      const u = q - p;
      curve[i] = weight;
      w[i] = weight;
      w1[i] = weight * u;
      w2[i] = weight * (u * u - 2 * pq);
    }
    return logLik - Math.log(product);
  },
};

const LN_SQRT_2PI = 0.9189385332046727;

/** φ(x)/Φ(x); for far negative x by the continued fraction of Mills' ratio (Abramowitz & Stegun 26.2.14). */
function inverseMills(x: number): number {
  if (x > -30) return Math.exp(-0.5 * x * x - LN_SQRT_2PI) / normalCdf(x);
  let fraction = -x;
  for (let k = 12; k >= 1; k--) fraction = -x + k / fraction;
  return fraction;
}

function logNormalCdf(x: number): number {
  if (x > 5) return Math.log1p(-normalCdf(-x));
  if (x > -30) return Math.log(normalCdf(x));
  return -0.5 * x * x - LN_SQRT_2PI - Math.log(inverseMills(x));
}

function probitAt(eta: number, out: Float64Array): void {
  const r1 = inverseMills(eta);
  const r0 = inverseMills(-eta);
  const g1 = -eta - r1;
  const g0 = r0 - eta;
  out[0] = logNormalCdf(eta);
  out[1] = logNormalCdf(-eta);
  out[2] = r1;
  out[3] = r0;
  out[4] = g1;
  out[5] = g0;
  out[6] = r0 * g0 - r1 * g1 - 2;
}

const probit: LinkFunction = {
  name: 'probit',
  eta: normalQuantile,
  at: probitAt,
  terms: termsBy(probitAt),
};

function cloglogAt(eta: number, out: Float64Array): void {
  const e = Math.exp(eta);
  // beyond e^η = 700 a slip is certain to double precision; only ln Q still changes
  const hazard = Math.min(e, 700);
  const r1 = hazard === 0 ? 1 : hazard / Math.expm1(hazard);
  const g1 = 1 - hazard - r1;
  out[0] = hazard < 1e-300 ? eta : Math.log(-Math.expm1(-hazard));
  out[1] = -e;
  out[2] = r1;
  out[3] = hazard;
  out[4] = g1;
  out[5] = 1;
  out[6] = -hazard - r1 * g1;
}

const cloglog: LinkFunction = {
  name: 'cloglog',
  eta: (p) => Math.log(-Math.log1p(-p)),
  at: cloglogAt,
  terms(eta, n, k, { score, curve, w, w1, w2 }) {
    let logLik = 0;
    for (let i = 0; i < n.length; i++) {
      const e = Math.exp(eta[i]);
      const hazard = e < 700 ? e : 700;
      const grown = Math.expm1(hazard);
      const slips = k[i];
      const holds = n[i] - slips;
      const r1 = hazard === 0 ? 1 : hazard / grown;
      const g1 = 1 - hazard - r1;
      if (slips > 0) logLik += slips * (hazard < 1e-300 ? eta[i] : Math.log(grown) - hazard);
      if (holds > 0) logLik -= holds * e;
      score[i] = slips * r1 - holds * hazard;
      curve[i] = holds * hazard - slips * r1 * g1;
      const weight = n[i] * r1 * hazard;
      const u = g1 + 1;
      w[i] = weight;
      w1[i] = weight * u;
      w2[i] = weight * (u * u - hazard - r1 * g1);
    }
    return logLik;
  },
};

const byName = { logit, probit, cloglog };

/** The link of a binary response: logit, probit or complementary log-log (McCullagh & Nelder 1989, 4.3.1). */
export function linkFunction(name: Link): LinkFunction {
  return byName[name];
}
