import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodyInertia } from '../../../shared/physics/bodyInertia.ts';
import {
  inertiaAt,
  inertiaPolynomial,
  totalMass,
} from '../../../shared/physics/inertiaPolynomial.ts';
import type { Body } from '../../../shared/schemas/buildUp.ts';
import { expectCheckValue } from '../../reference/checkValue.ts';

function body(overrides: Partial<Body>): Body {
  return {
    name: 'body',
    shape: { kind: 'point' },
    mass: 1,
    count: 1,
    placement: 'fixed',
    offsetMm: 0,
    ...overrides,
  };
}

describe('inertia of a build-up over the position of the slide', () => {
  it('adds a disc and two cylinders off the axis by the parallel-axis theorem', () => {
    const bodies = [
      body({ mass: 3, shape: { kind: 'solid cylinder, axial', radiusMm: 150 } }),
      body({
        mass: 0.5,
        count: 2,
        offsetMm: 100,
        shape: { kind: 'solid cylinder, axial', radiusMm: 40 },
      }),
    ];
    expectCheckValue('inertia.composite_disc_2cyl', inertiaPolynomial(bodies)[0]);
    expect(inertiaPolynomial(bodies).slice(1)).toEqual([0, 0]);
    expect(totalMass(bodies)).toBe(4);
  });

  it('is I₀ + m x² for a mass on the slide', () => {
    // 0.020 + 0.8 x² at 50, 100 and 150 mm: 0.022, 0.028, 0.038 (handbook, derived)
    const polynomial = inertiaPolynomial([
      body({ mass: 2, shape: { kind: 'hoop', radiusMm: 100 } }),
      body({ mass: 0.8, placement: 'slide' }),
    ]);
    for (const [mm, inertia] of [
      [50, 0.022],
      [100, 0.028],
      [150, 0.038],
    ] as const) {
      expect(inertiaAt(polynomial, mm)).toBeCloseTo(inertia, 14);
    }
  });

  it('equals the parallel-axis theorem at every position, offset and count', () => {
    const mm = fc.integer({ min: -500, max: 500 });
    fc.assert(
      fc.property(mm, mm, fc.integer({ min: 1, max: 6 }), (positionMm, offsetMm, count) => {
        const shape = { kind: 'block', widthMm: 30, depthMm: 20 } as const;
        const polynomial = inertiaPolynomial([
          body({ shape, mass: 0.7, count, placement: 'slide', offsetMm }),
        ]);
        const lever = (positionMm + offsetMm) / 1000;
        const expected = count * (bodyInertia(shape, 0.7) + 0.7 * lever ** 2);
        expect(Math.abs(inertiaAt(polynomial, positionMm) - expected)).toBeLessThan(1e-12);
      }),
    );
  });

  it('shifts a rod about its end from its centre of mass, never from its end', () => {
    const rod = body({ mass: 3, shape: { kind: 'rod, about its end', lengthMm: 400 } });
    expect(inertiaPolynomial([rod])[0]).toBeCloseTo((3 * 0.4 ** 2) / 3, 14);
    const shifted = inertiaPolynomial([{ ...rod, offsetMm: 100 }])[0];
    expect(shifted).toBeCloseTo((3 * 0.4 ** 2) / 12 + 3 * 0.3 ** 2, 14);
  });
});
