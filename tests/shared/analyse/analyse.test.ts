import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { analyse } from '../../../shared/analyse.ts';
import { checkRequest } from '../../../shared/checkRequest.ts';
import {
  analysisRequestSchema,
  analysisResultSchema,
  type AnalysisResult,
} from '../../../shared/schemas/analysis.ts';
import { arbitraryRequest } from './arbitraryRequest.ts';
import { simulate } from './simulate.ts';

function run(input: object): AnalysisResult {
  return analyse(analysisRequestSchema.parse(input));
}

const inertias = [8e-4, 1.3e-3, 1.9e-3, 2.6e-3, 3.4e-3];
const friction = {
  kinetic: { mean: 0.3, sd: 0.012, n: 8 },
  static: { mean: 0.36, sd: 0.015, n: 8 },
};
const torquePerMu = 0.05;
const healthy = { inertias, trials: 40, torque: 0.0165, slope: 25, seed: 3 };

function nonFinite(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => nonFinite(inner, `${path}.${key}`));
}

describe('whatever the trials', () => {
  it('no NaN or Infinity leaves, the shape is the contract, and ends enclose their estimate', () => {
    fc.assert(
      fc.property(arbitraryRequest, (request) => {
        const result = analyse(request);
        expect(nonFinite(result)).toEqual([]);
        analysisResultSchema.parse(result);
        for (const c of result.configurations) {
          for (const { estimate, lower, upper } of [
            c.alpha50.scaled,
            c.alpha50.offsets,
            c.alphaTarget,
          ]) {
            if (estimate !== null && lower !== null)
              expect(lower).toBeLessThanOrEqual(estimate * (1 + 1e-9));
            if (estimate !== null && upper !== null)
              expect(upper).toBeGreaterThanOrEqual(estimate * (1 - 1e-9));
          }
          expect(c.sentence).toContain(c.label);
        }
      }),
      { numRuns: 60, seed: 5 },
    );
  });

  it('a configuration without slips has no upper end and is never early', () => {
    fc.assert(
      fc.property(arbitraryRequest, (request) => {
        const result = analyse({ ...request, estimator: 'firth' });
        for (const c of result.configurations) {
          if (c.slips === 0) {
            expect(c.alpha50.offsets.upper).toBeNull();
            expect(c.shape.upper).toBeNull();
            expect(c.shape.state).not.toBe('early');
          }
          if (c.slips === c.trials) {
            expect(c.alpha50.offsets.lower).toBeNull();
            expect(c.shape.lower).toBeNull();
            expect(c.shape.state).not.toBe('late');
          }
        }
      }),
      { numRuns: 60, seed: 6 },
    );
  });
});

describe('trials that follow theory', () => {
  const result = run({ trials: simulate(healthy), torquePerMu, friction });

  it('are in line, with one common torque and μ its share of the seat torque', () => {
    expect(result.verdict).toBe('in line');
    expect(result.mu50.estimate!).toBeCloseTo(result.torque50.estimate! / torquePerMu, 12);
    const { exponent } = result.models.power;
    expect(exponent.lower!).toBeLessThan(1);
    expect(exponent.upper!).toBeGreaterThan(1);
  });

  it('are covered: of 40 seeded series at least 35 intervals hold the true torque', () => {
    // P(fewer than 35 of 40) is 1.4 % at an exact 95 %
    const held = Array.from({ length: 40 }, (_, seed) => {
      const design = { ...healthy, inertias: inertias.slice(0, 3), trials: 16, seed: 100 + seed };
      const { torque50 } = run({ trials: simulate(design) });
      return (
        (torque50.lower ?? 0) < healthy.torque && (torque50.upper ?? Infinity) > healthy.torque
      );
    });
    expect(held.filter(Boolean).length).toBeGreaterThanOrEqual(35);
  });

  it('give α₅₀ as torque over inertia in every configuration', () => {
    for (const c of result.configurations) {
      expect(c.alpha50.scaled.estimate! * c.inertia).toBeCloseTo(result.torque50.estimate!, 12);
    }
  });

  it('the exponent is 1 and theory exact when counts are the model’s own expectations', () => {
    // large counts on a fine grid: shares equal the probabilities to 1e-3
    const trials = inertias.slice(0, 3).flatMap((inertia, c) =>
      [-0.2, -0.1, 0, 0.1, 0.2].flatMap((x) => {
        const slips = Math.round(400 / (1 + Math.exp(-20 * x)));
        return Array.from({ length: 400 }, (_, i) => ({
          configuration: 'ABC'[c],
          inertia,
          acceleration: (0.0165 / inertia) * Math.exp(x),
          outcome: i < slips ? 'slipped' : 'held',
        }));
      }),
    );
    const exact = run({ trials });
    expect(exact.torque50.estimate!).toBeCloseTo(0.0165, 9);
    expect(exact.models.power.exponent.estimate!).toBeCloseTo(1, 9);
    expect(exact.comparisons.find((c) => c.fuller === 'offsets')!.statistic!).toBeLessThan(1e-6);
    expect(exact.counts.levels).toBe(15);
  });
});

describe('one configuration off the curve', () => {
  const trials = simulate({ ...healthy, shifts: [0, 0, -0.25, 0, 0] });
  const result = run({ trials, torquePerMu, friction, workingLimits: { '70 mm': 1 } });
  const low = result.configurations[2];

  it('alone is set apart, and its own shift feeds its α', () => {
    expect(result.configurations.map((c) => c.shape.state === 'early')).toEqual([
      false,
      false,
      true,
      false,
      false,
    ]);
    expect(low.alphaTarget.model).toBe('shifted');
    expect(low.shape.lower!).toBeLessThan(0.75);
    expect(low.shape.upper!).toBeGreaterThan(0.75);
    expect(low.level.state).toBe('slips early');
    expect(low.verdict).toBe('slips early');
    expect(result.verdict).toBe('slips early');
    expect(low.sentence).toMatch(/70 mm slips early/);
  });

  it('does not pull the common torque down', () => {
    expect(result.commonTorque50.estimate!).toBeGreaterThan(result.torque50.estimate!);
    expect(result.commonTorque50.lower!).toBeLessThan(healthy.torque);
    expect(result.commonTorque50.upper!).toBeGreaterThan(healthy.torque);
  });
});

describe('no common curve', () => {
  it('two configurations apart: neither is blamed, α comes from each, μ is withheld', () => {
    const trials = simulate({ ...healthy, inertias: inertias.slice(0, 2), shifts: [0, -0.25] });
    const result = run({ trials, torquePerMu, friction });
    expect(result.configurations.map((c) => c.shape.state)).toEqual([
      'no common curve',
      'no common curve',
    ]);
    expect(result.configurations.map((c) => c.alphaTarget.model)).toEqual(['offsets', 'offsets']);
    expect(result.mu50.estimate).toBeNull();
    expect(result.commonTorque50.estimate).toBeNull();
    expect(result.notes.join(' ')).toMatch(/do not share one curve/);
  });

  it('half of four apart is the same', () => {
    const trials = simulate({
      ...healthy,
      inertias: inertias.slice(0, 4),
      shifts: [0, 0, -0.3, 0.3],
    });
    const states = run({ trials }).configurations.map((c) => c.shape.state);
    expect(states.filter((state) => state === 'no common curve')).toHaveLength(3);
  });
});

describe('separated trials', () => {
  const rows: [string, number, number, string][] = [
    ['A', 0.001, 14, 'held'],
    ['A', 0.001, 15, 'held'],
    ['A', 0.001, 17, 'slipped'],
    ['A', 0.001, 18, 'slipped'],
    ['B', 0.002, 7, 'held'],
    ['B', 0.002, 7.6, 'held'],
    ['B', 0.002, 8.4, 'slipped'],
    ['B', 0.002, 9, 'slipped'],
  ];
  const trials = rows.map(([configuration, inertia, acceleration, outcome]) => ({
    configuration,
    inertia,
    acceleration,
    outcome,
  }));

  it('are said to be separated, with the bracket, and still bounded by the penalised fit', () => {
    const result = run({ trials });
    expect(result.separation).toEqual({
      overall: 'complete',
      configurations: { A: 'complete', B: 'complete' },
    });
    expect(result.configurations[0].highestHeld).toBe(15);
    expect(result.configurations[0].lowestSlipped).toBe(17);
    expect(result.status).toBe('converged');
    expect(result.torque50.lower!).toBeLessThan(0.0152);
    expect(result.torque50.upper!).toBeGreaterThan(0.0168);
  });

  it('are refused by plain maximum likelihood, with the reason and no number', () => {
    const result = run({ trials, estimator: 'ml' });
    expect(result.status).toBe('separated');
    expect(result.models.scaled.coefficients.map((c) => c.estimate)).toEqual([null, null]);
    expect(result.torque50).toEqual({ estimate: null, lower: null, upper: null });
    expect(result.notes.join(' ')).toMatch(/separate/);
  });

  it('a hold and a slip on the dividing level are quasi-separated', () => {
    const tied = [
      ...trials,
      { configuration: 'A', inertia: 0.001, acceleration: 17, outcome: 'held' },
    ];
    expect(run({ trials: tied }).separation.configurations.A).toBe('quasi');
  });
});

describe('what does not need a new fit', () => {
  it('gives the same numbers whether judged from the last fit or anew', () => {
    const request = analysisRequestSchema.parse({
      trials: simulate(healthy),
      torquePerMu,
      friction,
    });
    analyse(request);
    const options = { margin: 0.5, rule: 'theory', tolerance: 0.1 } as const;
    const again = analyse({ ...request, ...options });
    const anew = analyse({ ...request, ...options, trials: [...request.trials] });
    expect(again).toEqual(anew);
    expect(again.configurations[0].workingLimit!).toBeCloseTo(
      0.5 * again.configurations[0].theory.holding!,
      12,
    );
  });
});

describe('seat torque per configuration', () => {
  it('makes one common torque of different seats: J = I·K/T', () => {
    const trials = simulate({ ...healthy, inertias: inertias.slice(0, 3) }).map((trial, i) => ({
      ...trial,
      // the second configuration has half the seat torque, so half the acceleration
      acceleration: i >= 40 && i < 80 ? trial.acceleration / 2 : trial.acceleration,
    }));
    const own = {
      '20 mm': 0.05,
      '45 mm': 0.025,
      '70 mm': { value: 0.05, relativeUncertainty: 0.02 },
    };
    const result = run({ trials, torquePerMu: own, friction });
    const plain = run({
      trials: simulate({ ...healthy, inertias: inertias.slice(0, 3) }),
      torquePerMu: 0.05,
      friction,
    });
    expect(result.torque50.estimate!).toBeCloseTo(plain.torque50.estimate!, 9);
    expect(result.configurations[1].alpha50.scaled.estimate!).toBeCloseTo(
      plain.configurations[1].alpha50.scaled.estimate! / 2,
      9,
    );
    expect(result.configurations[1].theory.holding!).toBeCloseTo((0.3 * 0.025) / inertias[1], 9);
    expect(result.configurations[2].theory.holdingUncertainty!).toBeGreaterThan(
      result.configurations[0].theory.holdingUncertainty!,
    );
  });
});

describe('step-up series', () => {
  const single = simulate({ ...healthy, inertias: [8e-4], trials: 20 });
  const series = [16, 17, 18, 21].map((acceleration, i) => ({
    configuration: '20 mm',
    inertia: 8e-4,
    acceleration,
    outcome: i === 3 ? 'slipped' : 'held',
    series: 's1',
    order: i,
  }));

  it('stay out of the fit, counted and noted', () => {
    const result = run({ trials: [...single, ...series] });
    const without = run({ trials: single });
    expect(result.counts.trials).toBe(24);
    expect(result.configurations[0].trials).toBe(20);
    expect(result.torque50).toEqual(without.torque50);
    expect(result.notes.join(' ')).toMatch(/1 step-up series \(4 trials\) stayed out/);
  });

  it('a configuration with nothing but a series is reported without numbers, the others as ever', () => {
    const lone = series.map((trial) => ({ ...trial, configuration: 'x', inertia: 1e-3 }));
    const result = run({ trials: [...lone, ...single] });
    const without = run({ trials: single });
    expect(result.configurations[0].trials).toBe(0);
    expect(result.configurations[0].alpha50.offsets).toEqual({
      estimate: null,
      lower: null,
      upper: null,
    });
    expect(result.torque50.estimate!).toBeCloseTo(without.torque50.estimate!, 12);
    expect(result.models.offsets.coefficients.map((c) => c.name)).toEqual(['20 mm', 'slope']);
    expect(run({ trials: lone }).status).toBe('singular');
    expect(nonFinite(run({ trials: lone }))).toEqual([]);
  });

  it('trials that merely share a name do not make a series', () => {
    const mixed = series.map((trial) => ({ ...trial, outcome: 'slipped' }));
    expect(run({ trials: [...single, ...mixed] }).configurations[0].trials).toBe(24);
  });
});

describe('contradictions in a request', () => {
  const trials = simulate({ ...healthy, inertias: inertias.slice(0, 2), trials: 4 });
  const check = (input: object) => checkRequest(analysisRequestSchema.parse(input));

  it('two inertias for one configuration are refused by row', () => {
    const twisted = trials.map((trial, i) => (i === 2 ? { ...trial, inertia: 9e-4 } : trial));
    expect(check({ trials: twisted })[0].path).toBe('trials.2.inertia');
    expect(() => run({ trials: twisted })).toThrow(RangeError);
    expect(() => run({ trials: twisted })).toThrow(/trials\.2\.inertia/);
  });

  it('a missing seat torque and a limit for an unknown configuration are named', () => {
    expect(check({ trials, torquePerMu: { '20 mm': 0.05 } })[0].path).toBe('torquePerMu.45 mm');
    expect(check({ trials, workingLimits: { x: 3 } })[0].path).toBe('workingLimits.x');
    expect(check({ trials })).toEqual([]);
  });
});
