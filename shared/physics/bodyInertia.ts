import type { BodyShape } from '../schemas/buildUp.ts';
import { requireNonNegative, requirePositive } from './requireRange.ts';

/**
 * Moment of inertia of one body about its own axis, which is parallel to the fixture's axis:
 * through its centre of mass, except for a rod about its end (see `centreOffset`).
 *
 * @param shape - radii and lengths in mm, > 0 (an inner radius may equal the outer: thin wall)
 * @param mass - kg, > 0
 * @returns kg·m²
 * @throws RangeError if a dimension or the mass is out of range
 * @source Meriam & Kraige, Engineering Mechanics: Dynamics, appendix D (from memory)
 */
export function bodyInertia(shape: BodyShape, mass: number): number {
  requirePositive('mass', mass);
  switch (shape.kind) {
    case 'point':
      return 0;
    case 'hoop':
      return mass * squared('radiusMm', shape.radiusMm);
    case 'solid cylinder, axial':
      return (mass * squared('radiusMm', shape.radiusMm)) / 2;
    case 'solid cylinder, transverse':
      return (
        (mass * (3 * squared('radiusMm', shape.radiusMm) + squared('lengthMm', shape.lengthMm))) /
        12
      );
    case 'hollow cylinder, axial':
      return (mass * squaredRadii(shape.outerRadiusMm, shape.innerRadiusMm)) / 2;
    case 'hollow cylinder, transverse':
      return (
        (mass *
          (3 * squaredRadii(shape.outerRadiusMm, shape.innerRadiusMm) +
            squared('lengthMm', shape.lengthMm))) /
        12
      );
    case 'rod, about its centre':
      return (mass * squared('lengthMm', shape.lengthMm)) / 12;
    case 'rod, about its end':
      return (mass * squared('lengthMm', shape.lengthMm)) / 3;
    case 'block':
      return (mass * (squared('widthMm', shape.widthMm) + squared('depthMm', shape.depthMm))) / 12;
    case 'solid sphere':
      return (2 / 5) * mass * squared('radiusMm', shape.radiusMm);
    case 'thin sphere':
      return (2 / 3) * mass * squared('radiusMm', shape.radiusMm);
    case 'cone, axial':
      return (3 / 10) * mass * squared('radiusMm', shape.radiusMm);
  }
}

/**
 * How far the centre of mass lies from the body's own axis, m. Not 0 only for a rod about its
 * end, which points from there towards growing offset; the parallel-axis theorem starts from the
 * centre of mass, so a shift of such a rod must not be chained on mL²/3.
 */
export function centreOffset(shape: BodyShape): number {
  return shape.kind === 'rod, about its end' ? shape.lengthMm / 2000 : 0;
}

function squared(name: string, mm: number): number {
  requirePositive(name, mm);
  return (mm / 1000) ** 2;
}

/** R² + r²: the sum, not the difference, once the mass is given. */
function squaredRadii(outerMm: number, innerMm: number): number {
  requireNonNegative('innerRadiusMm', innerMm);
  if (innerMm > outerMm) throw new RangeError('innerRadiusMm must not exceed outerRadiusMm');
  return squared('outerRadiusMm', outerMm) + (innerMm / 1000) ** 2;
}
