import { describe, expect, it } from 'vitest';
import { verdictOf, worst } from '../../../shared/checks/verdict.ts';
import { verdicts } from '../../../shared/schemas/verdict.ts';

describe('verdict', () => {
  it('is the worst of the checks, in the order of the list', () => {
    expect(verdictOf('early', 'slips early', 'breached')).toBe('breached');
    expect(verdictOf('early', 'slips early', 'shown')).toBe('slips early');
    expect(verdictOf('early', 'in line', 'not shown')).toBe('early');
    expect(verdictOf('no common curve', 'undecided', 'not shown')).toBe('no common curve');
    expect(verdictOf('on curve', 'undecided', 'not shown')).toBe('not shown');
    expect(verdictOf('late', 'holds longer', 'shown')).toBe('holds longer');
    expect(verdictOf('late', 'in line', 'shown')).toBe('late');
  });

  it('an undecided shape does not count', () => {
    expect(verdictOf('undecided', 'in line', 'shown')).toBe('in line');
    expect(verdictOf('not applicable', 'in line', 'shown')).toBe('in line');
  });

  it('is never in line with a check missing', () => {
    expect(verdictOf('on curve', 'not checked', 'shown')).toBe('not checked');
    expect(verdictOf('on curve', 'in line', 'not checked')).toBe('not checked');
    expect(verdictOf('late', 'in line', 'not checked')).toBe('not checked');
  });

  it('of a fixture is the worst of its configurations', () => {
    for (const verdict of verdicts) expect(worst(['in line', verdict])).toBe(verdict);
  });
});
