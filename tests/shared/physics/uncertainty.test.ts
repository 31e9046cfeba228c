import { describe, expect, it } from 'vitest';
import { tQuantile } from '../../../shared/numeric/distributions.ts';
import { propagateUncertainty } from '../../../shared/physics/uncertainty.ts';
import { expectCheckValue } from '../../reference/checkValue.ts';

const inputs = [
  { name: 'mu', value: 0.3, uncertainty: 0.015 },
  { name: 'clamp force', value: 180, uncertainty: 3 },
  { name: 'radius', value: 0.05, uncertainty: 0.0005 },
  { name: 'fixed inertia', value: 0.004, uncertainty: 0.0001 },
  { name: 'R1', value: 0.12, uncertainty: 0.0003 },
  { name: 'position', value: 0.09, uncertainty: 0.0005 },
  { name: 'm1', value: 2.5, uncertainty: 0.005 },
  { name: 'm2', value: 0.8, uncertainty: 0.002 },
  { name: 'k2', value: 0.02, uncertainty: 0.0003 },
];

/** α = μ N r/I of a clamped part with masses that press and turn (handbook 6.2). */
function limit(values: readonly number[]): number {
  const [mu, clamp, radius, fixed, r1, position, m1, m2, k2] = values as [
    number,
    number,
    number,
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  const force = clamp + (m1 + m2) * 9.80665;
  return (mu * force * radius) / (fixed + (m1 * r1 ** 2) / 2 + m2 * (k2 ** 2 + position ** 2));
}

describe('uncertainty of theory', () => {
  it('agrees with the worked budget of the handbook, common masses correlated', () => {
    const budget = propagateUncertainty(inputs, limit);
    expectCheckValue('gum.alpha', budget.value);
    expectCheckValue('gum.u_c', budget.uncertainty);
    expectCheckValue(
      'gum.lower95_onesided',
      budget.value - 1.6448536269514722 * budget.uncertainty,
    );
    expect(budget.relative).toBeCloseTo(0.05319, 5);
    expect(budget.degrees).toBe(Infinity);
    // sensitivities and shares as printed there
    const printed = [
      [368.684, 0.8837],
      [0.520833, 0.0705],
      [2212.1, 0.0353],
      [-3840.46, 0.0043],
      [-1152.14, 0.0035],
      [-553.026, 0.0022],
      [-22.5437, 0.0004],
      [-27.5363, 0.0001],
      [-122.895, 0],
    ] as const;
    for (const [index, [sensitivity, share]] of printed.entries()) {
      const found = budget.contributions[index];
      expect(found?.sensitivity).toBeCloseTo(sensitivity, sensitivity > 1000 ? 1 : 2);
      expect(found?.share).toBeCloseTo(share, 4);
    }
    expect(budget.contributions.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
  });

  it('has few effective degrees of freedom when friction comes from five repeats', () => {
    const budget = propagateUncertainty(
      inputs.map((input) => (input.name === 'mu' ? { ...input, degrees: 4 } : input)),
      limit,
    );
    expectCheckValue('gum.nu_eff', budget.degrees);
    const half = tQuantile(0.975, Math.floor(budget.degrees)) * budget.uncertainty;
    expect(half).toBeCloseTo(15.12, 2);
  });

  it('is exact for a product: relative uncertainties add in quadrature', () => {
    const budget = propagateUncertainty(
      [
        { name: 'a', value: 3, uncertainty: 0.03 },
        { name: 'b', value: 7, uncertainty: 0.14 },
      ],
      ([a, b]) => (a ?? 0) / (b ?? 0) ** 2,
    );
    expect(budget.relative).toBeCloseTo(Math.hypot(0.01, 0.04), 9);
  });

  it('has nothing to share out when every input is certain', () => {
    const [certain] = propagateUncertainty(
      [{ name: 'a', value: 1, uncertainty: 0 }],
      ([a]) => a ?? 0,
    ).contributions;
    expect(certain).toEqual({ name: 'a', sensitivity: expect.closeTo(1, 9) as number, share: 0 });
  });

  it('refuses a negative uncertainty by name and a model without a positive value', () => {
    const bad = { name: 'clamp force', value: 1, uncertainty: -1 };
    expect(() => propagateUncertainty([bad], ([a]) => a ?? 0)).toThrow(
      /uncertainty of clamp force/,
    );
    expect(() => propagateUncertainty([{ ...bad, uncertainty: 0 }], () => Number.NaN)).toThrow(
      /the model must give/,
    );
  });
});
