import type { ModelFit } from '../schemas/analysis.ts';
import { apart, together, type Cells } from './cells.ts';
import type { BoundaryData } from './collect.ts';
import { fitCommonSlope, informationAt, type CommonSlopeFit } from './fitCommonSlope.ts';
import type { LinkFunction } from './link.ts';
import { arrowCovariance, modelFit, unfitted } from './modelFit.ts';
import { fitPower, type PowerModel } from './powerModel.ts';

/** The four models of the boundary. */
export interface Models {
  scaled: CommonSlopeFit;
  offsets: CommonSlopeFit;
  /** One fit per configuration, null where its trials bear no slope (a single level). */
  separate: (CommonSlopeFit | null)[];
  power: PowerModel;
}

/** The cells of one configuration alone. */
function cellsOf(cells: Cells, configuration: number): Cells {
  const rows = [...cells.configuration.keys()].filter(
    (i) => cells.configuration[i] === configuration,
  );
  return {
    size: rows.length,
    configurations: 1,
    configuration: new Int32Array(rows.length),
    z: Float64Array.from(rows, (i) => cells.z[i]),
    n: Float64Array.from(rows, (i) => cells.n[i]),
    k: Float64Array.from(rows, (i) => cells.k[i]),
  };
}

export function fitModels(data: BoundaryData, link: LinkFunction, penalised: boolean): Models {
  const { cells } = data;
  const count = cells.configurations;
  const scaled = fitCommonSlope(cells, together(count), link);
  return {
    scaled,
    offsets: count === 1 ? scaled : fitCommonSlope(cells, apart(count), link, scaled),
    separate: Array.from({ length: count }, (_, c) => {
      const own = cellsOf(cells, c);
      return own.size > 1 ? fitCommonSlope(own, together(1), link) : null;
    }),
    power: fitPower(data, link, penalised),
  };
}

interface Solution {
  a: Float64Array;
  b: number;
  logLik: number;
  penalisedLogLik: number;
  covariance: number[][];
}

/**
 * Estimates on the natural columns: group g's predictor is z − shift[g]. Null with the status when
 * plain maximum likelihood has no maximum.
 */
function solve(
  fit: CommonSlopeFit,
  penalised: boolean,
  shift: readonly number[],
): Solution | ModelFit['status'] {
  const { model } = fit;
  if (penalised) {
    const { status, a, b, value, logLik } = fit.penalised;
    if (status === 'singular') return 'singular';
    const covariance = arrowCovariance(fit.information, shift);
    const natural = a.map((own, g) => own + b * shift[g]);
    return { a: natural, b, logLik, penalisedLogLik: value, covariance };
  }
  const { attained, a, b, logLik } = fit.supremum;
  if (!attained || a === null || b === null) {
    return fit.penalised.status === 'singular' ? 'singular' : 'separated';
  }
  const information = informationAt(model, a, b);
  model.evaluate(a, b, 'common');
  return {
    a: a.map((own, g) => own + b * shift[g]),
    b,
    logLik,
    penalisedLogLik: model.value,
    covariance: arrowCovariance(information, shift),
  };
}

function describe(
  fit: CommonSlopeFit,
  penalised: boolean,
  shift: readonly number[],
  names: readonly string[],
  trials: number,
): ModelFit {
  const solution = solve(fit, penalised, shift);
  if (typeof solution === 'string') return unfitted(solution, names);
  const status = penalised ? fit.penalised.status : 'converged';
  const estimates = [...solution.a, solution.b];
  const { covariance, logLik, penalisedLogLik } = solution;
  return modelFit(status, names, estimates, covariance, logLik, penalisedLogLik, trials);
}

/** The wire forms of the four models, on their natural columns. */
export function describeModels(
  data: BoundaryData,
  models: Models,
  penalised: boolean,
): { scaled: ModelFit; power: ModelFit; offsets: ModelFit; separate: ModelFit } {
  const { configurations, centre } = data;
  const trials = configurations.reduce((sum, c) => sum + c.trials.length, 0);
  const labels = configurations.map((c) => c.label);
  const shifts = configurations.map((c) => Math.log(c.equivalentInertia) - centre);
  return {
    scaled: describe(models.scaled, penalised, [-centre], ['intercept', 'slope'], trials),
    power: describePower(models.power, penalised, trials),
    offsets: describe(models.offsets, penalised, shifts, [...labels, 'slope'], trials),
    separate: describeSeparate(models.separate, penalised, shifts, labels, trials),
  };
}

function describePower(power: PowerModel, penalised: boolean, trials: number): ModelFit {
  const names = ['intercept', 'lnAcceleration', 'lnInertia'];
  const { fit, separation, covariance, natural } = power;
  if (fit.status === 'singular' || covariance === null) {
    return unfitted(!penalised && separation !== 'none' ? 'separated' : 'singular', names);
  }
  if (!penalised && separation !== 'none') return unfitted('separated', names);
  const rows = [0, 1, 2].map((i) => [...covariance.subarray(3 * i, 3 * i + 3)]);
  return modelFit(fit.status, names, natural, rows, fit.logLik, fit.penalisedLogLik, trials);
}

function describeSeparate(
  fits: readonly (CommonSlopeFit | null)[],
  penalised: boolean,
  shifts: readonly number[],
  labels: readonly string[],
  trials: number,
): ModelFit {
  const parts = fits.map((fit, c) =>
    fit === null ? 'singular' : solve(fit, penalised, [shifts[c]]),
  );
  const names = labels.flatMap((label) => [`${label} intercept`, `${label} slope`]);
  const result = unfitted('converged', names);
  let logLik = 0;
  let penalisedLogLik = 0;
  const worst = { converged: 0, iterationLimit: 1, separated: 2, singular: 3 } as const;
  parts.forEach((part, c) => {
    if (typeof part === 'string') {
      if (worst[part] > worst[result.status]) result.status = part;
      logLik = NaN;
      penalisedLogLik = NaN;
      return;
    }
    const own = modelFit('converged', ['a', 'b'], [part.a[0], part.b], part.covariance, 0, 0, 0);
    own.coefficients.forEach(({ estimate, se }, i) => {
      Object.assign(result.coefficients[2 * c + i], { estimate, se });
      own.covariance[i].forEach((value, j) => (result.covariance[2 * c + i][2 * c + j] = value));
    });
    labels.forEach((_, other) => {
      if (other === c || typeof parts[other] === 'string') return;
      for (const i of [0, 1])
        for (const j of [0, 1]) result.covariance[2 * c + i][2 * other + j] = 0;
    });
    logLik += part.logLik;
    penalisedLogLik += part.penalisedLogLik;
  });
  if (Number.isFinite(logLik)) {
    const p = names.length;
    const described = modelFit('converged', [], [], [], logLik, penalisedLogLik, 0);
    result.logLik = described.logLik;
    result.penalisedLogLik = described.penalisedLogLik;
    const room = trials - p - 1;
    result.aicc = room > 0 ? -2 * logLik + 2 * p + (2 * p * (p + 1)) / room : null;
  }
  return result;
}
