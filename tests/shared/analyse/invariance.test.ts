import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { analyse } from '../../../shared/analyse.ts';
import type { AnalysisRequest, AnalysisResult } from '../../../shared/schemas/analysis.ts';
import { arbitraryRequest } from './arbitraryRequest.ts';

type Path = (result: AnalysisResult) => (number | null)[];

const ends = (i: { estimate: number | null; lower: number | null; upper: number | null }) => [
  i.estimate,
  i.lower,
  i.upper,
];

/** Accelerations of a result, in configuration order. */
const accelerations: Path = (result) =>
  [...result.configurations]
    .sort((x, y) => (x.label < y.label ? -1 : 1))
    .flatMap((c) => [
      ...ends(c.alpha50.scaled),
      ...ends(c.alpha50.offsets),
      ...ends(c.alphaTarget),
      c.demonstrated,
    ]);

/** Ratios, p-values and statistics: free of units. */
const pure: Path = (result) => [
  ...result.comparisons.flatMap((c) => [c.statistic, c.p]),
  ...ends(result.models.power.exponent),
  ...[...result.configurations]
    .sort((x, y) => (x.label < y.label ? -1 : 1))
    .flatMap((c) => [c.shape.ratio, c.shape.lower, c.shape.upper, c.shape.p]),
];

function expectSame(actual: (number | null)[], expected: (number | null)[], factor = 1): void {
  expect(actual.length).toBe(expected.length);
  actual.forEach((value, i) => {
    const other = expected[i];
    if (value === null || other === null) {
      expect(value, `value ${i}: ${value} against ${other}`).toBe(other);
      return;
    }
    const error = Math.abs(value - other * factor) / Math.max(1e-6, Math.abs(other * factor));
    expect(error, `value ${i}: ${value} against ${other * factor}`).toBeLessThan(1e-6);
  });
}

/** Requests whose fit is more than a few trials, so that ends are not decided by rounding. */
const requests = arbitraryRequest.filter((request) => request.trials.length > 7);

const units: Partial<AnalysisRequest> = {
  drive: undefined,
  friction: undefined,
  torquePerMu: undefined,
};

describe('an analysis does not depend on', () => {
  it('the units of acceleration and inertia', () => {
    fc.assert(
      fc.property(
        requests,
        fc.constantFrom(1e-3, 57.29577951308232, 9.80665e3),
        fc.constantFrom(1e-4, 7, 1e5),
        (request, a, i) => {
          const plain = analyse({ ...request, ...units });
          const turned = analyse({
            ...request,
            ...units,
            trials: request.trials.map((trial) => ({
              ...trial,
              acceleration: trial.acceleration * a,
              inertia: trial.inertia * i,
            })),
          });
          expectSame(accelerations(turned), accelerations(plain), a);
          expectSame(pure(turned), pure(plain));
          expectSame(ends(turned.torque50), ends(plain.torque50), a * i);
        },
      ),
      { numRuns: 40, seed: 11 },
    );
  });

  it('the order of the trials', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const bare = request.trials.map(({ series: _series, ...trial }) => trial);
        const plain = analyse({ ...request, ...units, trials: bare });
        const turned = analyse({ ...request, ...units, trials: [...bare].reverse() });
        expectSame(accelerations(turned), accelerations(plain));
        expectSame(pure(turned), pure(plain));
      }),
      { numRuns: 40, seed: 12 },
    );
  });

  it('the names of the configurations', () => {
    const names: Record<string, string> = { A: 'p 10', B: 'p 20', C: 'p 30', D: 'p 40' };
    fc.assert(
      fc.property(requests, (request) => {
        const plain = analyse({ ...request, ...units });
        const turned = analyse({
          ...request,
          ...units,
          trials: request.trials.map((trial) => ({
            ...trial,
            configuration: names[trial.configuration],
          })),
        });
        expectSame(accelerations(turned), accelerations(plain));
        expectSame(pure(turned), pure(plain));
        expect(turned.configurations.map((c) => c.verdict)).toEqual(
          plain.configurations.map((c) => c.verdict),
        );
      }),
      { numRuns: 30, seed: 13 },
    );
  });
});

describe('trials on equal levels', () => {
  it('count as often as they were run: levels stay, counts double', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const bare = request.trials.map(({ series: _series, ...trial }) => trial);
        const once = analyse({ ...request, trials: bare });
        const twice = analyse({ ...request, trials: bare.flatMap((trial) => [trial, trial]) });
        expect(twice.counts.levels).toBe(once.counts.levels);
        expect(twice.counts.trials).toBe(2 * once.counts.trials);
        expect(twice.separation).toEqual(once.separation);
        const { scaled } = twice.models;
        if (request.estimator === 'ml' && scaled.status === 'converged') {
          expectSame(
            scaled.coefficients.map((c) => c.estimate),
            once.models.scaled.coefficients.map((c) => c.estimate),
          );
          expectSame([scaled.logLik], [once.models.scaled.logLik], 2);
        }
      }),
      { numRuns: 40, seed: 14 },
    );
  });
});
