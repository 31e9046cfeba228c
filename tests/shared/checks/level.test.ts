import { describe, expect, it } from 'vitest';
import { levelCheck } from '../../../shared/checks/level.ts';
import type { Bound } from '../../../shared/checks/theory.ts';

const bound = (alpha: number, uncertainty: number | null): Bound => ({ alpha, uncertainty });
const alpha50 = (lower: number | null, upper: number | null) => ({
  estimate: lower !== null && upper !== null ? Math.sqrt(lower * upper) : null,
  lower,
  upper,
  absence: null,
});
const both = { kinetic: bound(10, 0.05), static: bound(12, 0.05) };
const state = (
  lower: number | null,
  upper: number | null,
  theory: Parameters<typeof levelCheck>[1] = both,
) => levelCheck(alpha50(lower, upper), theory, 0.15, 16).state;

describe('level', () => {
  it('slips early only when the whole interval lies below the holding bound with its uncertainty', () => {
    expect(state(8, 9.49)).toBe('slips early');
    expect(state(8, 9.51)).toBe('undecided');
  });

  it('holds longer only when the whole interval lies above the letting-go bound', () => {
    expect(state(12.61, 14)).toBe('holds longer');
    expect(state(12.59, 14)).toBe('undecided');
  });

  it('is in line when the interval lies inside the band, ends included', () => {
    expect(state(9.5, 12.6)).toBe('in line');
    expect(state(9.49, 12.6)).toBe('undecided');
  });

  it('is never in line when friction is known worse than the tolerance: more friction tests', () => {
    const loose = { kinetic: bound(10, 0.2), static: bound(12, 0.05) };
    const check = levelCheck(alpha50(10.2, 11), loose, 0.15, 16);
    expect(check.state).toBe('undecided');
    expect(check.reason).toMatch(/friction tests, not more trials/);
  });

  it('kinetic only: in line from the lower end alone, never holds longer', () => {
    const kinetic = { kinetic: bound(10, 0.05), static: null };
    expect(state(9.6, 40, kinetic)).toBe('in line');
    expect(state(30, null, kinetic)).toBe('in line');
    expect(state(8, 9, kinetic)).toBe('slips early');
  });

  it('static only: holds longer or undecided, nothing else', () => {
    const still = { kinetic: null, static: bound(12, 0.05) };
    expect(state(13, 14, still)).toBe('holds longer');
    expect(state(1, 2, still)).toBe('undecided');
    expect(state(11.5, 12, still)).toBe('undecided');
  });

  it('fewer than two friction tests of a kind leave it undecided', () => {
    expect(state(10.2, 11, { kinetic: bound(10, null), static: bound(12, 0.05) })).toBe(
      'undecided',
    );
    expect(state(1, 2, { kinetic: bound(10, null), static: bound(12, 0.05) })).toBe('undecided');
  });

  it('kinetic above static: the band runs from the lower to the higher', () => {
    const turned = { kinetic: bound(12, 0.05), static: bound(10, 0.05) };
    expect(state(9.6, 12.5, turned)).toBe('in line');
    expect(state(8, 9.4, turned)).toBe('slips early');
  });

  it('missing ends count as 0 and infinity', () => {
    expect(state(null, 9)).toBe('slips early');
    expect(state(13, null)).toBe('holds longer');
    expect(state(null, null)).toBe('undecided');
  });

  it('without friction it is not checked', () => {
    expect(state(9, 10, { kinetic: null, static: null })).toBe('not checked');
  });

  it('undecided says how many more trials, or that trials will not do', () => {
    expect(levelCheck(alpha50(9.2, 12.2), both, 0.15, 16).reason).toMatch(/About \d+ more trials/);
    expect(levelCheck(alpha50(8.6, 10.5), both, 0.15, 16).reason).toMatch(/not by trials/);
  });
});
