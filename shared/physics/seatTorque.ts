import { requireNonNegative, requirePositive } from './requireRange.ts';

/** A face that carries torque: normal force N and effective radius m. */
export type LoadedFace = { normalForce: number; radius: number };

/** What friction can carry: torque N·m about the axis and force N across it. */
export type SeatCapacity = { torque: number; force: number };

/**
 * Capacity of a seat per unit of friction coefficient: Σ N r and Σ N. Pass only faces that are
 * torsionally fixed to the table; a free-swivelling tip carries no torque.
 *
 * @throws RangeError if a force or radius is out of range
 */
export function seatTorque(faces: readonly LoadedFace[]): SeatCapacity {
  return seatCapacity(
    faces,
    faces.map(() => 1),
  );
}

/**
 * Capacity of a seat with each face's own friction coefficient: Σ μ N r and Σ μ N.
 *
 * @param mus - one per face, ≥ 0
 * @throws RangeError if the lengths differ or a value is out of range
 */
export function seatCapacity(faces: readonly LoadedFace[], mus: readonly number[]): SeatCapacity {
  if (mus.length !== faces.length) throw new RangeError('mus must hold one value per face');
  let torque = 0;
  let force = 0;
  for (const [index, { normalForce, radius }] of faces.entries()) {
    const mu = mus[index] ?? Number.NaN;
    requireNonNegative('mu', mu);
    requireNonNegative('normalForce', normalForce);
    requirePositive('radius', radius);
    force += mu * normalForce;
    torque += mu * normalForce * radius;
  }
  return { torque, force };
}
