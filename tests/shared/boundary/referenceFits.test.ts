import { describe, expect, it } from 'vitest';
import { together, apart } from '../../../shared/boundary/cells.ts';
import { fitCommonSlope, type CommonSlopeFit } from '../../../shared/boundary/fitCommonSlope.ts';
import { fitLinear, withCoefficient } from '../../../shared/boundary/fitLinear.ts';
import { coefficientInterval } from '../../../shared/boundary/linearProfile.ts';
import { linearSeparation } from '../../../shared/boundary/linearSeparation.ts';
import { linkFunction } from '../../../shared/boundary/link.ts';
import { arrowCovariance } from '../../../shared/boundary/modelFit.ts';
import { maximiseUnder } from '../../../shared/boundary/fitCommonSlope.ts';
import { unconstrained } from '../../../shared/boundary/constraint.ts';
import {
  flatDeviance,
  quantileInterval,
  type Basis,
} from '../../../shared/boundary/profileInterval.ts';
import type { LinearProblem } from '../../../shared/boundary/fitLinear.ts';
import type { Link } from '../../../shared/schemas/analysis.ts';
import {
  cellsOf,
  problemOf,
  readExpected,
  readJson,
  readTable,
  type ReferenceFit,
  type ReferenceModel,
} from '../../reference/statistics/readReference.ts';

const CRIT = 3.8414588206941236;

function column(rows: Record<string, string>[], name: string): number[] {
  return rows.map((row) => Number(row[name]));
}

/** Relative closeness, absolute near zero. */
function close(actual: number, expected: number, relative: number): void {
  const error = Math.abs(actual - expected) / Math.max(1e-6, Math.abs(expected));
  expect(error, `${actual} against ${expected}`).toBeLessThan(relative);
}

function sameFit(problem: LinearProblem, reference: ReferenceFit, penalised: boolean): void {
  const fit = fitLinear(problem, penalised);
  expect(fit.status).toBe('converged');
  reference.coefficients.forEach((value, j) => close(fit.beta[j], value, 1e-9));
  const p = problem.columns;
  reference.vcov.flat().forEach((value, i) => close(fit.covariance![i], value, 1e-8));
  reference.standard_errors.forEach((value, j) =>
    close(Math.sqrt(fit.covariance![j * p + j]), value, 1e-8),
  );
  close(fit.logLik, reference.loglik_bernoulli, 1e-10);
  close(fit.penalisedLogLik, reference.penalized_loglik, 1e-10);
  for (const [j, profile] of (reference.profile_95_coefficients ?? []).entries()) {
    const interval = coefficientInterval(problem, fit, penalised, j, CRIT);
    close(interval.lower!, Number(profile.lower), 1e-7);
    close(interval.upper!, Number(profile.upper), 1e-7);
    const without = fitLinear(problem, penalised, withCoefficient(p, j, 0));
    close(2 * (fit.value - without.value), profile.deviance_at_zero, 1e-8);
  }
}

function sameQuantiles(
  fit: CommonSlopeFit,
  group: number,
  label: string,
  reference: ReferenceFit,
  basis: Basis,
  link: Link,
): void {
  const quantiles = (reference.quantiles ?? []).filter((q) => q.group === label);
  expect(quantiles.length).toBeGreaterThan(0);
  for (const { p, x_p, profile } of quantiles) {
    const eta = linkFunction(link).eta(p);
    const interval = quantileInterval(fit, group, eta, basis, CRIT, false);
    close(interval.estimate!, x_p, 1e-9);
    if (!profile) continue;
    close(interval.lower!, profile.lower, 1e-7);
    close(interval.upper!, profile.upper, 1e-7);
    close(flatDeviance(fit, basis), profile.deviance_limit_slope_zero, 1e-8);
  }
}

describe('the general fit agrees with R (glm, brglm2) and a second program', () => {
  const cases: [string, string, Link, () => LinearProblem][] = [];
  const beetles = readTable('bliss_beetles.csv');
  for (const link of ['logit'] as const) {
    cases.push([
      'bliss_beetles',
      link,
      link,
      () =>
        problemOf(
          column(beetles, 'log10_dose').map((x) => [1, x]),
          column(beetles, 'n'),
          column(beetles, 'killed'),
          link,
        ),
    ]);
  }
  const binary = (file: string, names: string[], y: string, transform = (x: number) => x) => {
    const rows = readTable(file);
    return problemOf(
      rows.map((row) => [1, ...names.map((name) => transform(Number(row[name])))]),
      rows.map(() => 1),
      column(rows, y),
    );
  };
  cases.push(
    ['vaso', 'logit', 'logit', () => binary('vaso.csv', ['volume', 'rate'], 'y', Math.log)],
    ['oring', 'logit', 'logit', () => binary('oring.csv', ['temperature_F'], 'any_failure')],
    ['up_and_down', 'logit', 'logit', () => binary('up_and_down.csv', ['level'], 'y')],
    ['endometrial', 'logit', 'logit', () => binary('endometrial.csv', ['NV', 'PI', 'EH'], 'HG')],
    [
      'sex2',
      'logit',
      'logit',
      () => binary('sex2.csv', ['age', 'oc', 'vic', 'vicl', 'vis', 'dia'], 'case'),
    ],
    [
      'menarche',
      'logit',
      'logit',
      () => {
        const rows = readTable('menarche.csv');
        return problemOf(
          column(rows, 'age').map((x) => [1, x]),
          column(rows, 'n'),
          column(rows, 'reached'),
        );
      },
    ],
  );
  for (const [dataset, key, link, problem] of cases) {
    it(`${dataset}, ${link}: coefficients, covariance, log-likelihoods and profile limits`, () => {
      const reference = readExpected<Record<string, ReferenceModel | undefined>>(dataset)[key]!;
      if (reference.ml.exists) sameFit(problem(), reference.ml, false);
      if (reference.firth) sameFit(problem(), reference.firth, true);
    });
  }

  it('budworm: common and separate slopes, and the test between them', () => {
    const rows = readTable('budworm.csv');
    const sex = rows.map((row) => (row.sex === 'F' ? 0 : 1));
    const dose = column(rows, 'ldose');
    const [n, k] = [column(rows, 'n'), column(rows, 'dead')];
    const reference = readExpected<{
      common_slope: ReferenceModel;
      separate_slopes: ReferenceModel;
      tests: { separate_vs_common_slope: { ml_LR: number; firth_PLR_full_model_penalty: number } };
    }>('budworm');
    const common = problemOf(
      rows.map((_, i) => [1 - sex[i], sex[i], dose[i]]),
      n,
      k,
    );
    const separate = problemOf(
      rows.map((_, i) => [1 - sex[i], sex[i], (1 - sex[i]) * dose[i], sex[i] * dose[i]]),
      n,
      k,
    );
    for (const penalised of [false, true]) {
      const which = penalised ? 'firth' : 'ml';
      sameFit(common, reference.common_slope[which], penalised);
      sameFit(separate, reference.separate_slopes[which], penalised);
    }
    const statistic = (penalised: boolean) => {
      const equal = {
        origin: new Float64Array(4),
        basis: Float64Array.from([1, 0, 0, 0, 1, 0, 0, 0, 1, 0, 0, 1]),
        free: 3,
      };
      return (
        2 * (fitLinear(separate, penalised).value - fitLinear(separate, penalised, equal).value)
      );
    };
    const { ml_LR, firth_PLR_full_model_penalty } = reference.tests.separate_vs_common_slope;
    close(statistic(false), ml_LR, 1e-8);
    close(statistic(true), firth_PLR_full_model_penalty, 1e-8);
  });

  it('sex2: the published penalised test of vic = 2, vicl = 0', () => {
    const rows = readTable('sex2.csv');
    const names = ['age', 'oc', 'vic', 'vicl', 'vis', 'dia'];
    const problem = problemOf(
      rows.map((row) => [1, ...names.map((name) => Number(row[name]))]),
      rows.map(() => 1),
      column(rows, 'case'),
    );
    const kept = [0, 1, 2, 5, 6];
    const basis = new Float64Array(7 * 5);
    kept.forEach((j, f) => (basis[j * 5 + f] = 1));
    const origin = Float64Array.from([0, 0, 0, 2, 0, 0, 0]);
    const full = fitLinear(problem, true);
    const constrained = fitLinear(problem, true, { origin, basis, free: 5 });
    const reference = readExpected<{ plr_vic_equals_2_and_vicl_equals_0: { PLR: number } }>('sex2');
    close(
      2 * (full.value - constrained.value),
      reference.plr_vic_equals_2_and_vicl_equals_0.PLR,
      1e-8,
    );
  });
});

describe('the common-slope fit agrees with the same references', () => {
  const single: [string, string, string, string | null, string][] = [
    ['bliss_beetles', 'bliss_beetles.csv', 'log10_dose', 'n', 'killed'],
    ['oring', 'oring.csv', 'temperature_F', null, 'any_failure'],
    ['menarche', 'menarche.csv', 'age', 'n', 'reached'],
    ['up_and_down', 'up_and_down.csv', 'level', null, 'y'],
  ];
  for (const [dataset, file, x, n, k] of single) {
    for (const link of ['logit'] as const) {
      const reference = readExpected<Record<string, ReferenceModel | undefined>>(dataset)[link];
      if (!reference) continue;
      it(`${dataset}, ${link}: coefficients, covariance and quantile profile limits`, () => {
        const rows = readTable(file);
        const sign = dataset === 'oring' ? -1 : 1; // failures fall with temperature
        const cells = cellsOf(
          column(rows, x).map((value) => sign * value),
          n === null ? rows.map(() => 1) : column(rows, n),
          column(rows, k),
        );
        const fit = fitCommonSlope(cells, together(1), linkFunction(link));
        const firth = reference.firth;
        if (firth) {
          close(fit.penalised.a[0], firth.coefficients[0], 1e-9);
          close(fit.penalised.b, sign * firth.coefficients[1], 1e-9);
          close(fit.penalised.value, firth.penalized_loglik, 1e-10);
          const covariance = arrowCovariance(fit.information, [0]);
          close(covariance[0][0], firth.vcov[0][0], 1e-8);
          close(covariance[0][1], sign * firth.vcov[0][1], 1e-8);
          close(covariance[1][1], firth.vcov[1][1], 1e-8);
        }
        close(fit.supremum.a![0], reference.ml.coefficients[0], 1e-9);
        close(fit.supremum.b!, sign * reference.ml.coefficients[1], 1e-9);
        if (sign < 0) return; // quantiles of the mirrored predictor have mirrored ends
        if (firth?.quantiles) sameQuantiles(fit, 0, 'all', firth, 'penalised', link);
        if (reference.ml.quantiles) sameQuantiles(fit, 0, 'all', reference.ml, 'plain', link);
      });
    }
  }

  it('budworm: LD50 and LD1 of both sexes with a common slope, and separate slopes', () => {
    const rows = readTable('budworm.csv');
    const group = rows.map((row) => (row.sex === 'F' ? 0 : 1));
    const cells = cellsOf(column(rows, 'ldose'), column(rows, 'n'), column(rows, 'dead'), group);
    const fit = fitCommonSlope(cells, apart(2), linkFunction('logit'));
    const reference = readExpected<{
      common_slope: ReferenceModel;
      separate_slopes: ReferenceModel;
      tests: { separate_vs_common_slope: { firth_PLR_full_model_penalty: number } };
    }>('budworm');
    for (const [g, label] of ['F', 'M'].entries()) {
      sameQuantiles(fit, g, label, reference.common_slope.firth, 'penalised', 'logit');
      sameQuantiles(fit, g, label, reference.common_slope.ml, 'plain', 'logit');
    }
    const separate = reference.separate_slopes.firth.penalized_loglik;
    const inside = maximiseUnder(fit.model, unconstrained(2), 'separate').value;
    close(
      2 * (separate - inside),
      reference.tests.separate_vs_common_slope.firth_PLR_full_model_penalty,
      1e-8,
    );
  });
});

describe('probit and complementary log-log', () => {
  const rows = readTable('bliss_beetles.csv');
  const dose = column(rows, 'log10_dose');
  const [n, k] = [column(rows, 'n'), column(rows, 'killed')];
  for (const link of ['probit', 'cloglog'] as const) {
    it(`${link}: plain coefficients and standard errors agree with glm`, () => {
      const reference =
        readExpected<
          Record<string, { coefficients: number[]; standard_errors: number[]; dose_p50: number }>
        >('bliss_beetles')[link];
      const fit = fitLinear(
        problemOf(
          dose.map((x) => [1, x]),
          n,
          k,
          link,
        ),
        false,
      );
      reference.coefficients.forEach((value, j) => close(fit.beta[j], value, 1e-9));
      reference.standard_errors.forEach((value, j) =>
        close(Math.sqrt(fit.covariance![3 * j]), value, 1e-8),
      );
    });

    it(`${link}: penalised fit and profile limits agree with an optimisation in base R`, () => {
      // firthLinks.R: general optimisers, so slopes to 1e-6 and limits to 1e-7
      const reference =
        readJson<
          Record<
            string,
            Record<'slope' | 'x50' | 'penalisedLogLik', number> &
              Record<'x50Ends' | 'x01Ends', number[]>
          >
        >('firthLinks.json')[link];
      const fit = fitCommonSlope(cellsOf(dose, n, k), together(1), linkFunction(link));
      close(fit.penalised.b, reference.slope, 1e-6);
      close(fit.penalised.value, reference.penalisedLogLik, 1e-11);
      for (const [p, ends] of [
        [0.5, reference.x50Ends],
        [0.01, reference.x01Ends],
      ] as const) {
        const eta = linkFunction(link).eta(p);
        const interval = quantileInterval(fit, 0, eta, 'penalised', CRIT, false);
        close(interval.lower!, ends[0], 1e-7);
        close(interval.upper!, ends[1], 1e-7);
      }
    });
  }
});

describe('separation of data with several columns', () => {
  it('finds endometrial and sex2 quasi-completely separated, vaso and oring not', () => {
    const of = (file: string, names: string[], y: string) => {
      const rows = readTable(file);
      return problemOf(
        rows.map((row) => [1, ...names.map((name) => Number(row[name]))]),
        rows.map(() => 1),
        column(rows, y),
      );
    };
    expect(linearSeparation(of('endometrial.csv', ['NV', 'PI', 'EH'], 'HG'))).toBe('quasi');
    const sex2 = ['age', 'oc', 'vic', 'vicl', 'vis', 'dia'];
    expect(linearSeparation(of('sex2.csv', sex2, 'case'))).toBe('quasi');
    expect(linearSeparation(of('vaso.csv', ['volume', 'rate'], 'y'))).toBe('none');
    expect(linearSeparation(of('oring.csv', ['temperature_F'], 'any_failure'))).toBe('none');
  });
});
