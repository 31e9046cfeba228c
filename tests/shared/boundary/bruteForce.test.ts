import { describe, expect, it } from 'vitest';
import { apart, together } from '../../../shared/boundary/cells.ts';
import { fitCommonSlope } from '../../../shared/boundary/fitCommonSlope.ts';
import { linkFunction } from '../../../shared/boundary/link.ts';
import { quantileInterval, shiftInterval } from '../../../shared/boundary/profileInterval.ts';
import { shiftDeviance } from '../../../shared/boundary/shiftSearch.ts';
import { cellsOf } from '../../reference/statistics/readReference.ts';

/*
 * A second implementation of the definitions that shares nothing with the product: the information
 * as a dense determinant, maxima by scanning grids and golden section, suprema by steep slopes.
 */
interface Trial {
  g: number;
  z: number;
  y: number;
}

const lnP = (eta: number) =>
  eta > 0 ? -Math.log1p(Math.exp(-eta)) : eta - Math.log1p(Math.exp(eta));

function logLik(trials: Trial[], a: number[], b: number): number {
  return trials.reduce((sum, { g, z, y }) => sum + lnP((y ? 1 : -1) * (a[g] + b * z)), 0);
}

function determinant(m: number[][]): number {
  const a = m.map((row) => [...row]);
  let det = 1;
  for (let i = 0; i < a.length; i++) {
    det *= a[i][i];
    for (let r = i + 1; r < a.length; r++) {
      const f = a[r][i] / a[i][i];
      for (let c = i; c < a.length; c++) a[r][c] -= f * a[i][c];
    }
  }
  return det;
}

function penalised(trials: Trial[], a: number[], b: number): number {
  const p = a.length + 1;
  const info = Array.from({ length: p }, () => new Array<number>(p).fill(0));
  for (const { g, z } of trials) {
    const eta = a[g] + b * z;
    const w = Math.exp(lnP(eta) + lnP(-eta));
    info[g][g] += w;
    info[g][p - 1] += w * z;
    info[p - 1][g] += w * z;
    info[p - 1][p - 1] += w * z * z;
  }
  return logLik(trials, a, b) + 0.5 * Math.log(determinant(info));
}

function golden(f: (x: number) => number, from: number, to: number): number {
  const ratio = (Math.sqrt(5) - 1) / 2;
  let [low, high] = [from, to];
  let [c, d] = [high - ratio * (high - low), low + ratio * (high - low)];
  let [fc, fd] = [f(c), f(d)];
  for (let i = 0; i < 45; i++) {
    if (fc > fd) high = d;
    else low = c;
    c = high - ratio * (high - low);
    d = low + ratio * (high - low);
    fc = f(c);
    fd = f(d);
  }
  return Math.max(fc, fd);
}

/** Maximum over a grid, refined around every local best. */
function scan(f: (x: number) => number, grid: number[]): number {
  const v = grid.map((x) => {
    const value = f(x);
    return Number.isNaN(value) ? -Infinity : value;
  });
  let best = -Infinity;
  v.forEach((value, i) => {
    if (value < (v[i - 1] ?? -Infinity) || value < (v[i + 1] ?? -Infinity)) return;
    const refined = golden(f, grid[Math.max(0, i - 1)], grid[Math.min(grid.length - 1, i + 1)]);
    best = Math.max(best, value, Number.isNaN(refined) ? -Infinity : refined);
  });
  return best;
}

function slopes(n: number, most: number): number[] {
  const up = Array.from({ length: n }, (_, i) => 0.02 * (most / 0.02) ** (i / (n - 1)));
  return [...up.map((b) => -b).reverse(), 0, ...up];
}

const steps = (n: number, reach: number) =>
  Array.from({ length: n }, (_, i) => reach * ((2 * i) / (n - 1) - 1));

describe('one separated configuration, against a scan of all slopes', () => {
  const trials: Trial[] = [
    [-0.31, 0],
    [-0.22, 0],
    [-0.12, 0],
    [-0.05, 0],
    [0.02, 0],
    [0.11, 1],
    [0.16, 1],
    [0.33, 1],
  ].map(([z, y]) => ({ g: 0, z, y }));
  const fit = fitCommonSlope(
    cellsOf(
      trials.map((t) => t.z),
      trials.map(() => 1),
      trials.map((t) => t.y),
    ),
    together(1),
    linkFunction('logit'),
  );
  const grid = slopes(160, 4000);
  const full = scan(
    (b) => scan((c) => penalised(trials, [-b * c], b), steps(60, 1)),
    slopes(60, 400),
  );

  for (const [p, crit] of [
    [0.5, 3.841458820694124],
    [0.01, 2.705543454095404],
  ] as const) {
    it(`the ends of the profile of x${p} lie where the scanned deviance crosses ${crit.toFixed(2)}`, () => {
      const eta = Math.log(p / (1 - p));
      const interval = quantileInterval(fit, 0, eta, 'penalised', crit, false);
      const deviance = (x: number) =>
        2 * (full - scan((b) => penalised(trials, [eta - b * x], b), grid));
      expect(deviance(interval.lower!)).toBeCloseTo(crit, 6);
      expect(deviance(interval.upper!)).toBeCloseTo(crit, 6);
      for (let i = 1; i < 12; i++) {
        const x = interval.lower! + ((interval.upper! - interval.lower!) * i) / 12;
        expect(deviance(x)).toBeLessThan(crit);
      }
    });
  }
});

describe('the guard of two configurations, against scans', () => {
  const trials: Trial[] = [
    ...[
      [-0.3, 0],
      [-0.18, 0],
      [-0.1, 0],
      [-0.02, 1],
      [0.05, 0],
      [0.14, 1],
      [0.25, 1],
    ].map(([z, y]) => ({ g: 0, z, y })),
    // tried only well below the boundary
    ...[
      [-0.42, 0],
      [-0.35, 0],
      [-0.27, 0],
      [-0.2, 0],
      [-0.16, 0],
      [-0.12, 0],
    ].map(([z, y]) => ({ g: 1, z, y })),
  ];
  const cells = cellsOf(
    trials.map((t) => t.z),
    trials.map(() => 1),
    trials.map((t) => t.y),
    trials.map((t) => t.g),
  );
  const fit = fitCommonSlope(cells, apart(2), linkFunction('logit'));
  const crit = 3.841458820694124;
  const own = trials.filter((t) => t.g === 0);
  const grid = slopes(40, 300);
  const centres = steps(50, 1.5);
  const fullPenalised = fit.penalised.value;
  // configuration 1 held throughout: its intercept runs off and its likelihood tends to 1
  const fullPlain = scan((b) => scan((c) => logLik(own, [-b * c], b), centres), slopes(60, 300));

  it('the unpenalised supremum leaves out the configuration that only held', () => {
    expect(fit.supremum.logLik).toBeCloseTo(fullPlain, 6);
    expect(fit.supremum.attained).toBe(false);
  });

  const plainShift = (delta: number) => {
    const moved = trials.map((t) => ({ ...t, g: 0, z: t.z - (t.g === 1 ? delta : 0) }));
    return (
      2 *
      (fullPlain - scan((b) => scan((c) => logLik(moved, [-b * c], b), centres), slopes(60, 600)))
    );
  };
  const penalisedShift = (delta: number) =>
    2 *
    (fullPenalised -
      scan((b) => scan((c) => penalised(trials, [-b * c, -b * (c + delta)], b), centres), grid));

  it('a shift interval is where the smaller of both deviances stays below crit', () => {
    const shift = shiftInterval(fit, 1, 'guarded', crit);
    expect(shift.upper).toBeNull();
    expect(shift.absence).toBe('no slips');
    const at = (d: number) => Math.min(plainShift(d), penalisedShift(d));
    expect(at(shift.lower!)).toBeCloseTo(crit, 3);
    for (const further of [0.02, 0.1, 0.3, 0.8])
      expect(at(shift.lower! + further)).toBeLessThan(crit);
    expect(at(shift.lower! - 0.01)).toBeGreaterThan(crit);
  });

  it('a test of no shift takes the smaller of both deviances', () => {
    const [plain, penalty] = [plainShift(0), penalisedShift(0)];
    expect(shiftDeviance(fit, 1, 'penalised')).toBeCloseTo(penalty, 4);
    expect(shiftDeviance(fit, 1, 'plain')).toBeCloseTo(plain, 4);
    expect(shiftDeviance(fit, 1, 'guarded')).toBeCloseTo(Math.min(plain, penalty), 4);
  });

  it('a configuration without slips has no upper end and no estimate of its own', () => {
    const interval = quantileInterval(fit, 1, 0, 'guarded', crit, true);
    expect(interval.upper).toBeNull();
    expect(interval.estimate).toBeNull();
    expect(interval.lower).not.toBeNull();
  });
});
