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

const probit: LinkFunction = {
  name: 'probit',
  eta: normalQuantile,
  at(eta, out) {
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
  },
};

const cloglog: LinkFunction = {
  name: 'cloglog',
  eta: (p) => Math.log(-Math.log1p(-p)),
  at(eta, out) {
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
  },
};

const byName = { logit, probit, cloglog };

/** The link of a binary response: logit, probit or complementary log-log (McCullagh & Nelder 1989, 4.3.1). */
export function linkFunction(name: Link): LinkFunction {
  return byName[name];
}
