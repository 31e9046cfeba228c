import { describe, expect, it } from 'vitest';
import {
  binomialUpper,
  chiSquareQuantile,
  chiSquareUpper,
  clopperPearsonLower,
  clopperPearsonUpper,
  normalCdf,
  normalQuantile,
  successRun,
  tQuantile,
} from '../../../shared/numeric/distributions.ts';
import { linkFunction } from '../../../shared/boundary/link.ts';
import { readTable } from '../../reference/statistics/readReference.ts';

function error(actual: number, expected: number): number {
  return Math.abs(actual - expected) / Math.max(1e-300, Math.abs(expected));
}

function worst(fn: string, value: (...args: number[]) => number, keep = (_: number[]) => true) {
  const rows = readTable('special_functions.csv')
    .filter((row) => row.fn === fn)
    .map((row) => [row.arg1, row.arg2, row.arg3, row.value_mpmath].map(Number))
    .filter((row) => row[3] !== 0 && keep(row));
  expect(rows.length).toBeGreaterThan(0);
  return Math.max(...rows.map(([x, a, b, expected]) => error(value(x, a, b), expected)));
}

describe('distributions agree with R and mpmath', () => {
  it('normal', () => {
    expect(worst('pnorm', normalCdf)).toBeLessThan(1e-12);
    expect(worst('pnorm_upper', (x) => normalCdf(-x))).toBeLessThan(1e-12);
    expect(worst('qnorm', normalQuantile)).toBeLessThan(1e-12);
  });

  it('chi-square with whole degrees of freedom, far tail included', () => {
    const whole = ([, df]: number[]) => Number.isInteger(df);
    expect(worst('pchisq_upper', chiSquareUpper, whole)).toBeLessThan(1e-11);
    expect(worst('qchisq', chiSquareQuantile)).toBeLessThan(1e-8);
  });

  it('Student t quantiles', () => {
    expect(worst('qt', tQuantile)).toBeLessThan(1e-8);
  });

  it('binomial tails as incomplete beta', () => {
    const whole = ([, a, b]: number[]) => Number.isInteger(a) && Number.isInteger(b);
    expect(worst('pbeta', (x, a, b) => binomialUpper(a, a + b - 1, x), whole)).toBeLessThan(1e-9);
  });

  it('probit and logit log probabilities', () => {
    const out = new Float64Array(7);
    const lnP = (link: 'probit' | 'logit') => (x: number) => {
      linkFunction(link).at(x, out);
      return out[0];
    };
    expect(worst('pnorm_log', lnP('probit'))).toBeLessThan(1e-12);
    expect(worst('plogis_log', lnP('logit'))).toBeLessThan(1e-12);
  });
});

describe('exact binomial statements', () => {
  it('one-sided Clopper–Pearson limits equal the reference table', () => {
    for (const row of readTable('clopper_pearson.csv')) {
      const [x, n, c] = [row.x, row.n, row.confidence].map(Number);
      expect(error(clopperPearsonUpper(x, n, c), Number(row.one_sided_upper))).toBeLessThan(1e-9);
      const lower = Number(row.one_sided_lower);
      const ours = clopperPearsonLower(x, n, c);
      if (lower === 0) expect(ours).toBe(0);
      else expect(error(ours, lower)).toBeLessThan(1e-9);
    }
  });

  it('success-run lengths equal the reference table', () => {
    for (const row of readTable('success_run.csv').filter(({ failures }) => failures === '0')) {
      expect(successRun(Number(row.confidence), Number(row.reliability))).toBe(Number(row.n));
    }
  });

  it('a single slip in five trials speaks against 1 %, one in two hundred does not', () => {
    expect(binomialUpper(1, 5, 0.01)).toBeLessThan(0.05);
    expect(binomialUpper(1, 200, 0.01)).toBeGreaterThan(0.05);
  });

  it('nothing tried leaves everything open', () => {
    expect(clopperPearsonUpper(0, 0, 0.95)).toBe(1);
  });

  it('refuses impossible arguments by name', () => {
    expect(() => chiSquareUpper(1, 0.5)).toThrow(/df/);
    expect(() => successRun(1, 0.9)).toThrow(/confidence/);
    expect(() => successRun(0.9, 0)).toThrow(/reliability/);
  });
});
