import { describe, expect, it } from 'vitest';
import { limitFunction } from '../../../shared/limits/limitFunction.ts';
import { markDiscount } from '../../../shared/limits/markDiscount.ts';
import { roundDown, workingLimit } from '../../../shared/limits/workingLimit.ts';
import { collect } from '../../../shared/boundary/collect.ts';
import type { Judgement } from '../../../shared/schemas/trial.ts';

describe('working limit', () => {
  it('rounds down to the resolution, a value within 1e-9 below a step being that step', () => {
    expect(roundDown(9.47, 0.1)).toBe(9.4);
    expect(roundDown(0.30000000000000004, 0.1)).toBe(0.3);
    expect(roundDown(9.4 * (1 - 5e-10), 0.1)).toBe(9.4);
    expect(roundDown(9.4 * (1 - 5e-9), 0.1)).toBe(9.3);
    expect(roundDown(17, 2.5)).toBe(15);
  });

  it('takes the lower of theory and demonstrated and says which binds', () => {
    expect(workingLimit('lower of both', 8, 9, undefined)).toEqual({
      byRule: 8,
      limit: 8,
      binds: 'theory',
    });
    expect(workingLimit('lower of both', 9, 8, undefined).binds).toBe('demonstrated');
    expect(workingLimit('theory', 9, 8, undefined).limit).toBe(9);
    expect(workingLimit('demonstrated', null, 8, undefined).limit).toBe(8);
  });

  it('is capped by the drive, while the rule keeps its own value', () => {
    const drive = { maxAcceleration: 7.55, resolution: 0.1 };
    expect(workingLimit('theory', 9, null, drive)).toEqual({
      byRule: 9,
      limit: 7.5,
      binds: 'drive',
    });
  });

  it('does not exist when the rule lacks what it needs', () => {
    expect(workingLimit('lower of both', 9, null, undefined)).toEqual({
      byRule: null,
      limit: null,
      binds: null,
    });
  });
});

describe('limit function', () => {
  it('is the lowest torque over all configurations', () => {
    const limits = [
      { byRule: 10, equivalentInertia: 0.001 },
      { byRule: 4, equivalentInertia: 0.002 },
    ];
    expect(limitFunction(limits)).toEqual({ torque: 0.008, from: 'min over configurations' });
  });

  it('does not exist when one configuration has no limit', () => {
    expect(limitFunction([{ byRule: null, equivalentInertia: 1 }])).toBeNull();
  });
});

describe('discount for what an end mark hides', () => {
  const configuration = (judgedBy: Judgement) =>
    collect({
      trials: [{ configuration: 'A', inertia: 1, acceleration: 1, outcome: 'held', judgedBy }],
      failure: 'slipped',
    }).configurations[0];

  it('is (1 − s)/(1 + s), s = √(φ/θ): a 4.6° slip of 180° at κ = 0.95 leaves 0.12°', () => {
    const kappa = 0.95;
    const mark = Math.PI * ((1 - kappa) / (1 + kappa)) ** 2;
    const visible = { moveAngle: Math.PI, smallestVisibleSlip: mark };
    expect(markDiscount(configuration('end mark'), visible)).toBeCloseTo(kappa, 12);
    expect(markDiscount(configuration('by eye'), visible)).toBeCloseTo(kappa, 12);
  });

  it('is not applied to peak lag, and needs move angle and smallest slip otherwise', () => {
    expect(markDiscount(configuration('peak lag'), {})).toBe(1);
    expect(markDiscount(configuration('end mark'), { moveAngle: 3 })).toBeNull();
    expect(
      markDiscount(configuration('end mark'), { moveAngle: 1, smallestVisibleSlip: 2 }),
    ).toBeNull();
  });
});
