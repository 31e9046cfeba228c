import { EigenvalueDecomposition, Matrix } from 'ml-matrix';
import type { AnalysisTrial } from '../schemas/analysis.ts';
import { chiSquareUpper } from '../numeric/distributions.ts';
import type { BoundaryData } from './collect.ts';
import type { CommonSlopeFit } from './fitCommonSlope.ts';
import { fitLinear, withCoefficient, type LinearProblem } from './fitLinear.ts';
import { linearSeparation } from './linearSeparation.ts';
import type { LinkFunction } from './link.ts';
import { finite } from './modelFit.ts';
import { NO_SLOPE } from './profileInterval.ts';

export interface Heterogeneity {
  /** χ²/df, null when it cannot be judged. */
  ratio: number | null;
  p: number | null;
  /** What crit is multiplied by: the ratio when above 1 with p < 0.05, else 1. */
  factor: number;
  /** Which scatter was judged. */
  between: 'levels' | 'seatings' | 'batches' | null;
  /** Number of seatings or batches. */
  clusters: number;
}

function judged(
  statistic: number,
  df: number,
  between: Heterogeneity['between'],
  clusters: number,
): Heterogeneity {
  const ratio = df > 0 ? finite(statistic / df) : null;
  if (ratio === null) return { ratio: null, p: null, factor: 1, between: null, clusters };
  const p = chiSquareUpper(statistic, df);
  return { ratio, p, factor: ratio > 1 && p < 0.05 ? ratio : 1, between, clusters };
}

/**
 * Scatter beyond binomial, judged on the offsets model so that a shift does not count as scatter.
 * Pearson χ²/df over levels when most levels hold three trials or more (df = levels − intercepts −
 * 1); otherwise between seatings, or batches: the score test of one effect per cluster, rᵀC⁺r with
 * C the covariance of the clusters' residual sums given the fit.
 *
 * @source Finney 1971, Probit Analysis, 4.5 (heterogeneity factor); McCullagh & Nelder 1989, 4.5
 */
export function heterogeneity(
  data: BoundaryData,
  offsets: CommonSlopeFit,
  failed: (trial: AnalysisTrial) => boolean,
): Heterogeneity {
  const { cells } = data;
  const none: Heterogeneity = { ratio: null, p: null, factor: 1, between: null, clusters: 0 };
  if (offsets.penalised.status !== 'converged') return none;
  const { a, b } = offsets.penalised;
  const out = new Float64Array(7);
  const { link } = offsets.model;
  const tied = cells.n.filter((n) => n >= 3).length;
  if (2 * tied > cells.size) {
    let statistic = 0;
    for (let i = 0; i < cells.size; i++) {
      link.at(a[cells.configuration[i]] + b * cells.z[i], out);
      const p = Math.exp(out[0]);
      const q = Math.exp(out[1]);
      statistic += (cells.k[i] - cells.n[i] * p) ** 2 / (cells.n[i] * p * q);
    }
    return judged(statistic, cells.size - cells.configurations - 1, 'levels', cells.size);
  }
  for (const [between, field] of [
    ['seatings', 'seating'],
    ['batches', 'batch'],
  ] as const) {
    const result = betweenClusters(data, offsets, failed, field, between);
    if (result) return result;
  }
  return none;
}

function betweenClusters(
  data: BoundaryData,
  offsets: CommonSlopeFit,
  failed: (trial: AnalysisTrial) => boolean,
  field: 'seating' | 'batch',
  between: 'seatings' | 'batches',
): Heterogeneity | null {
  const { configurations, centre, cells } = data;
  if (configurations.some((c) => c.trials.some((trial) => trial[field] === undefined))) return null;
  const index = new Map<string, number>();
  for (const c of configurations) {
    for (const trial of c.trials) {
      if (!index.has(trial[field]!)) index.set(trial[field]!, index.size);
    }
  }
  const clusters = index.size;
  if (clusters < 2 || clusters > 200) return null;
  const { a, b } = offsets.penalised;
  const { link } = offsets.model;
  const { weight, mean, spread } = offsets.information;
  const slopeVariance = 1 / spread.reduce((sum, v) => sum + v, 0);
  const out = new Float64Array(7);
  const groups = cells.configurations;
  const residual = new Float64Array(clusters);
  const own = new Float64Array(clusters);
  // Σ of weights, and of weights × (z − the group's mean), per cluster and group
  const shares = new Float64Array(clusters * groups);
  const levers = new Float64Array(clusters);
  configurations.forEach((c, g) => {
    const lnJ = Math.log(c.equivalentInertia);
    for (const trial of c.trials) {
      const z = Math.log(trial.acceleration) + lnJ - centre;
      link.at(a[g] + b * z, out);
      const score = failed(trial) ? out[2] : -out[3];
      const w = out[2] * out[3];
      const s = index.get(trial[field]!)!;
      residual[s] += score;
      own[s] += w;
      shares[s * groups + g] += w;
      levers[s] += w * (z - mean[g]);
    }
  });
  // covariance of the residual sums, the fitted intercepts and slope taken out
  const covariance = new Float64Array(clusters * clusters);
  for (let s = 0; s < clusters; s++) {
    for (let t = 0; t < clusters; t++) {
      let value = s === t ? own[s] : 0;
      for (let g = 0; g < groups; g++) {
        value -= (shares[s * groups + g] * shares[t * groups + g]) / weight[g];
      }
      covariance[s * clusters + t] = value - levers[s] * levers[t] * slopeVariance;
    }
  }
  // the fit ties the residual sums together: a generalised inverse leaves those directions out
  const { realEigenvalues, eigenvectorMatrix } = new EigenvalueDecomposition(
    Matrix.from1DArray(clusters, clusters, covariance),
    { assumeSymmetric: true },
  );
  const largest = Math.max(...realEigenvalues);
  let statistic = 0;
  let df = 0;
  realEigenvalues.forEach((value, e) => {
    if (!(value > 1e-9 * largest)) return;
    let along = 0;
    for (let s = 0; s < clusters; s++) along += eigenvectorMatrix.get(s, e) * residual[s];
    statistic += (along * along) / value;
    df += 1;
  });
  return judged(statistic, df, between, clusters);
}

/**
 * Drift over the run order: γ·(order scaled to 0…1) added to the scaled model. The change is the
 * ratio e^{−γ/b} of the holding torque at the end to that at the start.
 */
export function drift(
  data: BoundaryData,
  link: LinkFunction,
  penalised: boolean,
  failed: (trial: AnalysisTrial) => boolean,
): { change: number | null; p: number | null; note: string | null } {
  const none = { change: null, p: null };
  const trials = data.configurations.flatMap((c) =>
    c.trials.map((trial) => ({
      trial,
      z: Math.log(trial.acceleration) + Math.log(c.equivalentInertia) - data.centre,
    })),
  );
  const orders = trials.flatMap(({ trial }) => (trial.order === undefined ? [] : [trial.order]));
  if (orders.length < trials.length) {
    const note =
      orders.length === 0
        ? 'Drift is not judged: the trials carry no run order.'
        : 'Drift is not judged: some trials carry no run order.';
    return { ...none, note };
  }
  const first = orders.reduce((least, value) => Math.min(least, value), Infinity);
  const last = orders.reduce((most, value) => Math.max(most, value), -Infinity);
  if (!(last > first)) {
    return { ...none, note: 'Drift is not judged: all trials carry the same run order.' };
  }
  const problem: LinearProblem = {
    columns: 3,
    design: Float64Array.from(
      trials.flatMap(({ trial, z }) => [1, z, (trial.order! - first) / (last - first)]),
    ),
    n: new Float64Array(trials.length).fill(1),
    k: Float64Array.from(trials, ({ trial }) => (failed(trial) ? 1 : 0)),
    link,
  };
  const full = fitLinear(problem, penalised);
  if (full.status !== 'converged' || (!penalised && linearSeparation(problem, full) !== 'none')) {
    return {
      ...none,
      note: 'Drift is not judged: run order and acceleration cannot be told apart.',
    };
  }
  const without = fitLinear(problem, penalised, withCoefficient(3, 2, 0));
  const b = full.beta[1];
  return {
    change: b > NO_SLOPE ? finite(Math.exp(-full.beta[2] / b)) : null,
    p: finite(chiSquareUpper(Math.max(0, 2 * (full.value - without.value)), 1)),
    note: b > NO_SLOPE ? null : 'Drift has no size: the share of slips does not rise.',
  };
}
