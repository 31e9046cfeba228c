import { describe, expect, it } from 'vitest';
import { checkWords, formatP } from '../../../src/features/boundary/checkWords.ts';
import { comparisonWords } from '../../../src/features/boundary/comparisonWords.ts';
import { mapAlternative } from '../../../src/features/boundary/mapAlternative.ts';
import { judgedAlpha50, mapSceneOf } from '../../../src/features/boundary/mapSceneOf.ts';
import { analysisResult, boundaryOf, configurationResult } from './boundaryFixtures.ts';

const options = { tolerance: 0.15, confidence: 0.95, target: 0.01 };
const common = { estimate: 0.02, lower: 0.019, upper: 0.021 };
const early = configurationResult({
  shape: { ratio: 0.7712, lower: 0.71, upper: 0.84, p: 0.0002, state: 'early' },
  verdict: 'early',
});

describe('the acceleration a verdict rests on', () => {
  it('comes from the common torque while the configuration is on the curve', () => {
    const { estimate, own } = judgedAlpha50(configurationResult(), common);
    expect(estimate).toBeCloseTo(20, 12);
    expect(own).toBe(false);
  });

  it('is its own once the configuration is set apart', () => {
    expect(judgedAlpha50(early, common)).toEqual({ ...early.alpha50.offsets, own: true });
  });
});

describe('the map of a boundary', () => {
  it('carries each configuration’s own fit, its position and whether it is set apart', () => {
    const scene = mapSceneOf(boundaryOf(analysisResult([early])), [], 90, {
      view: 'position',
      scale: 'linear',
      chosen: '45 mm',
    });
    expect(scene?.view).toBe('position');
    expect(scene?.configurations[0]).toMatchObject({
      positionMm: 45,
      setApart: true,
      alpha50: early.alpha50.offsets,
    });
    expect(scene?.inertiaAt(45)).toBeCloseTo(1e-3, 9);
  });

  it('falls back on inertia where no position is known', () => {
    const boundary = { ...boundaryOf(analysisResult([early])), positions: [] };
    const view = { view: 'position', scale: 'log', chosen: null } as const;
    expect(mapSceneOf(boundary, [], null, view)?.view).toBe('inertia');
  });

  it('does not exist before the first trial', () => {
    const view = { view: 'inertia', scale: 'log', chosen: null } as const;
    expect(mapSceneOf(boundaryOf(null), [], null, view)).toBeNull();
  });

  it('is told in words with counts and every configuration', () => {
    const words = mapAlternative(analysisResult([early]), 'inertia');
    expect(words).toContain('16 trials, 9 held, 6 slipped, 1 lost');
    expect(words).toContain(
      '45 mm: early, half slip at 19.6 (18.0–21.4), working limit 12.6 rad/s²',
    );
  });
});

describe('the three checks in words', () => {
  it('name the ratio, its interval and p of a configuration set apart', () => {
    const [shape] = checkWords(early, options);
    expect(shape?.words).toContain('×0.77 (0.71–0.84)');
    expect(shape?.words).toContain('p < 0.001');
  });

  it('name both bounds of theory with their uncertainty', () => {
    const level = checkWords(configurationResult(), options)[1];
    expect(level?.words).toContain('holding bound 18.0 ± 4\u00A0%');
    expect(level?.words).toContain('letting-go bound 23.0 ± 5\u00A0%');
  });

  it('count the slips at or below the limit, with the bound by the count alone', () => {
    const margin = checkWords(configurationResult(), options)[2];
    expect(margin?.words).toBe(
      'No slip in 6 trials at or below 12.6 rad/s²; by the count alone at most 39\u00A0% slip there (95\u00A0% confidence).',
    );
  });

  it('say that a limit below every trial rests on extrapolation', () => {
    const margin = checkWords(
      configurationResult({
        margin: {
          state: 'not shown',
          judged: 5,
          slipsAtOrBelow: 0,
          trialsAtOrBelow: 0,
          upperBound: 1,
        },
      }),
      options,
    )[2];
    expect(margin?.words).toContain('extrapolation only');
  });

  it('say what is missing when there is no limit to judge', () => {
    const margin = checkWords(
      configurationResult({
        margin: {
          state: 'not checked',
          judged: null,
          slipsAtOrBelow: 0,
          trialsAtOrBelow: 0,
          upperBound: null,
        },
      }),
      options,
    )[2];
    expect(margin?.words).toContain('test the friction first');
  });

  it('write an open end of a ratio as open, not as a number', () => {
    const open = configurationResult({
      shape: { ratio: 1.1, lower: 0.9, upper: null, p: 0.5, state: 'undecided' },
    });
    expect(checkWords(open, options)[0]?.words).toContain('×1.10 (0.90–…)');
  });
});

describe('model comparisons in words', () => {
  const comparison = { simpler: 'scaled', fuller: 'offsets', statistic: 20, df: 4, p: 0.0004 };

  it('speak against the simpler model when p is small', () => {
    expect(comparisonWords(comparison, 0.95)).toContain(
      'speak against “one torque for all configurations”',
    );
  });

  it('say that nothing speaks against it otherwise, with p', () => {
    expect(comparisonWords({ ...comparison, p: 0.31 }, 0.95)).toContain('(p = 0.31)');
  });

  it('never show a p of zero', () => {
    expect(formatP(1e-12)).toBe('< 0.001');
  });
});
