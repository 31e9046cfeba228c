import { describe, expect, it } from 'vitest';
import { marginCheck } from '../../../shared/checks/margin.ts';

const target = (lower: number | null, upper: number | null) => ({
  estimate: null,
  lower,
  upper,
  absence: null,
});
const state = (
  lower: number | null,
  upper: number | null,
  slips: number,
  trials: number,
  share = 0.01,
) => marginCheck(10, target(lower, upper), { slips, trials }, share, 0.95).state;

describe('margin', () => {
  it('is breached when even the upper bound lies below the limit', () => {
    expect(state(5, 9.99, 0, 3)).toBe('breached');
    expect(state(5, 10, 0, 3)).toBe('not shown');
  });

  it('is breached by one slip in five, not by one in two hundred', () => {
    expect(state(11, null, 1, 5)).toBe('breached');
    expect(state(11, null, 1, 200)).toBe('shown');
  });

  it('one slip below the limit blocks a short series even with a good lower bound', () => {
    // P(X ≥ 1 | 6, 0.5 %) = 0.0296 would breach; at 2 % it is 0.114 and only blocks
    expect(state(11, null, 1, 6, 0.02)).toBe('not shown');
  });

  it('is shown when the lower bound reaches the limit, a tie within 1e-9 included', () => {
    expect(state(10, null, 0, 0)).toBe('shown');
    expect(state(10 * (1 - 1e-10), null, 0, 0)).toBe('shown');
    expect(state(9.999, null, 0, 0)).toBe('not shown');
  });

  it('allows n·target slips, rounded down without losing whole products', () => {
    // 100 · 0.29 = 28.999999999999996 in doubles
    expect(state(11, null, 29, 100, 0.29)).toBe('shown');
    expect(state(11, null, 30, 100, 0.29)).toBe('not shown');
  });

  it('a missing lower bound shows nothing; no limit, no check', () => {
    expect(state(null, null, 0, 50)).toBe('not shown');
    expect(marginCheck(null, target(1, 2), { slips: 0, trials: 0 }, 0.01, 0.95).state).toBe(
      'not checked',
    );
  });

  it('says the model-free bound beside it: 3 of 60 slips at most 12.5 %', () => {
    const { upperBound } = marginCheck(10, target(1, 20), { slips: 3, trials: 60 }, 0.5, 0.95);
    // one-sided 95 % Clopper–Pearson, qbeta(0.95, 4, 57) in R
    expect(upperBound).toBeCloseTo(0.124187210477436, 10);
    expect(marginCheck(10, target(1, 20), { slips: 0, trials: 0 }, 0.5, 0.95).upperBound).toBe(1);
  });
});
