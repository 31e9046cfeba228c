import { standardGravity } from './gravity.ts';
import { requireNonNegative, requirePositive } from './requireRange.ts';

type Measured = { value: number; uncertainty: number };

/**
 * Moment of inertia from the period of a bifilar pendulum (two parallel cords, small yaw):
 * I = m g d² T² / (16 π² L).
 *
 * @param mass - kg, > 0
 * @param spacing - distance between the cords, m, > 0
 * @param length - of the cords, m, > 0
 * @param period - of one full swing, s, > 0
 * @returns kg·m²
 * @throws RangeError naming the argument out of range
 * @source standard result for small amplitudes; Hinrichsen, bi- and trifilar suspensions
 */
export function bifilarInertia(
  mass: number,
  spacing: number,
  length: number,
  period: number,
): number {
  requirePositive('mass', mass);
  requirePositive('spacing', spacing);
  requirePositive('length', length);
  requirePositive('period', period);
  return (mass * standardGravity * spacing ** 2 * period ** 2) / (16 * Math.PI ** 2 * length);
}

/**
 * Standard relative uncertainty of a bifilar inertia, first order:
 * (u_I/I)² = (u_m/m)² + (2u_d/d)² + (2u_T/T)² + (u_L/L)².
 *
 * @throws RangeError naming the argument out of range
 * @source JCGM 100:2008, 5.1.6
 */
export function bifilarUncertainty(
  mass: Measured,
  spacing: Measured,
  length: Measured,
  period: Measured,
): number {
  return Math.hypot(
    relative('mass', mass),
    2 * relative('spacing', spacing),
    relative('length', length),
    2 * relative('period', period),
  );
}

function relative(name: string, { value, uncertainty }: Measured): number {
  requirePositive(name, value);
  requireNonNegative(`uncertainty of ${name}`, uncertainty);
  return uncertainty / value;
}
