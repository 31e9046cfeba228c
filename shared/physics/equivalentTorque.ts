import type { SeatCapacity } from './seatTorque.ts';
import { requirePositive } from './requireRange.ts';
import { theoryLimit, type HeldPart, type Move } from './theoryLimit.ts';

/** Torque per unit of μ, N·m, and whether the limit is strictly proportional to μ. */
export type EquivalentTorque = { torquePerMu: number; proportional: boolean };

/**
 * The torque per unit of friction coefficient with which a configuration obeys
 * α_th = μ·T_c/I_c, off-centre mass and move included. Under a speed cap or on a tilted axis α_th
 * is not proportional to μ; T_c is then right at the μ given and a close approximation beside it.
 *
 * @param inertia - about the axis, kg·m²
 * @param perMu - capacity of the seat per unit of μ (Σ N r, Σ N)
 * @param mu - where to evaluate, > 0: the kinetic coefficient if there is one
 * @returns N·m; 0 when the part would slide at rest
 * @throws RangeError naming the argument out of range
 */
export function equivalentTorque(
  inertia: number,
  perMu: SeatCapacity,
  mu: number,
  part: HeldPart,
  move: Move,
  lateralWeight = 0,
): EquivalentTorque {
  requirePositive('mu', mu);
  const limitAt = (value: number): number =>
    theoryLimit(
      inertia,
      { torque: value * perMu.torque, force: value * perMu.force },
      part,
      move,
      lateralWeight,
    );
  const limit = limitAt(mu);
  const half = limitAt(mu / 2) * 2;
  return {
    torquePerMu:
      part.eccentricity === 0 && lateralWeight === 0 ? perMu.torque : (limit * inertia) / mu,
    proportional: Math.abs(half - limit) <= 1e-9 * limit,
  };
}
