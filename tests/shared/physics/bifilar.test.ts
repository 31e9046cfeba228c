import { describe, expect, it } from 'vitest';
import { bifilarInertia, bifilarUncertainty } from '../../../shared/physics/bifilar.ts';
import { expectCheckValue } from '../../reference/checkValue.ts';

describe('inertia from a bifilar pendulum', () => {
  it('agrees with the formula of the handbook', () => {
    expectCheckValue('inertia.bifilar', bifilarInertia(1.2, 0.2, 0.8, 1.1));
  });

  it('counts spacing and period twice in its uncertainty', () => {
    const sure = { value: 1, uncertainty: 0 };
    const unsure = { value: 2, uncertainty: 0.02 };
    expect(bifilarUncertainty(unsure, sure, sure, sure)).toBeCloseTo(0.01, 15);
    expect(bifilarUncertainty(sure, unsure, sure, sure)).toBeCloseTo(0.02, 15);
    expect(bifilarUncertainty(sure, sure, unsure, sure)).toBeCloseTo(0.01, 15);
    expect(bifilarUncertainty(sure, sure, sure, unsure)).toBeCloseTo(0.02, 15);
    expect(bifilarUncertainty(unsure, unsure, unsure, unsure)).toBeCloseTo(
      0.01 * Math.sqrt(10),
      15,
    );
  });

  it('refuses a period of 0 by name', () => {
    expect(() => bifilarInertia(1, 1, 1, 0)).toThrow(RangeError);
    expect(() => bifilarInertia(1, 1, 1, 0)).toThrow(/^period must be/);
  });
});
