import type { Body } from '../schemas/buildUp.ts';
import { bodyInertia, centreOffset } from './bodyInertia.ts';

/** Coefficients of I(x) = c₀ + c₁x + c₂x², x in m and I in kg·m². */
export type InertiaPolynomial = [number, number, number];

/**
 * Moment of inertia of a build-up about the fixture's axis as a function of the slide's position:
 * a fixed body gives I_G + m d², a body on the slide I_G + m (x + d)² (parallel-axis theorem).
 *
 * @throws RangeError if a body's mass or dimension is out of range
 */
export function inertiaPolynomial(bodies: readonly Body[]): InertiaPolynomial {
  const sum: InertiaPolynomial = [0, 0, 0];
  for (const { shape, mass, count, placement, offsetMm } of bodies) {
    const lever = centreOffset(shape);
    const aboutCentre = bodyInertia(shape, mass) - mass * lever ** 2;
    const offset = offsetMm / 1000 + lever;
    sum[0] += count * (aboutCentre + mass * offset ** 2);
    if (placement === 'slide') {
      sum[1] += count * 2 * mass * offset;
      sum[2] += count * mass;
    }
  }
  return sum;
}

/** I(x) in kg·m² at a position of the slide. */
export function inertiaAt(polynomial: readonly number[], positionMm: number): number {
  const x = positionMm / 1000;
  return polynomial.reduceRight((value, coefficient) => value * x + coefficient, 0);
}

/** Mass of everything that turns with the part, kg. */
export function totalMass(bodies: readonly Body[]): number {
  return bodies.reduce((sum, { mass, count }) => sum + count * mass, 0);
}
