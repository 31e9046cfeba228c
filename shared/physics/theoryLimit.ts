import { requireNonNegative, requirePositive } from './requireRange.ts';
import type { SeatCapacity } from './seatTorque.ts';

/** What would move: mass kg, distance of its centre of mass from the axis m. */
export type HeldPart = { mass: number; eccentricity: number };

/** Angle rad and, if the drive reaches it, peak speed rad/s. */
export type Move = { angle: number; maxSpeed: number | null };

const centred: HeldPart = { mass: 1, eccentricity: 0 };

/**
 * Acceleration at which friction can no longer carry the part: τ/I when it is centred on a
 * vertical axis. Otherwise on the limit-surface ellipse (T/τ)² + (F/F_cap)² = 1 at the worst
 * instant of a triangular move, the end of the ramp, where ω² = αθ (or the speed cap's square):
 *
 *   T = Iα + e·G,  F = m e √(α² + ω⁴) + G,  G the sideways weight of a tilted axis
 *
 * The exact capacity lies up to 6.6 % (disc), 10 % (ring), 18 % (three pads) below the ellipse.
 * A jerk limit lowers the peak speed; it is left out here, which errs on the safe side.
 *
 * @param inertia - about the fixture's axis (I_G + m e²), kg·m², > 0
 * @param seat - capacity with friction: torque N·m, force N, both > 0
 * @param part - mass kg > 0, eccentricity m ≥ 0
 * @param move - angle rad > 0; peak speed rad/s > 0 or null
 * @param lateralWeight - G, N, ≥ 0
 * @returns rad/s²; 0 when the part would slide at rest
 * @throws RangeError naming the argument out of range
 * @source Goyal, Ruina & Papadopoulos 1991; Howe & Cutkosky 1996
 */
export function theoryLimit(
  inertia: number,
  seat: SeatCapacity,
  part: HeldPart = centred,
  move: Move = { angle: Math.PI, maxSpeed: null },
  lateralWeight = 0,
): number {
  requirePositive('inertia', inertia);
  requirePositive('torque', seat.torque);
  requirePositive('force', seat.force);
  requirePositive('mass', part.mass);
  requireNonNegative('eccentricity', part.eccentricity);
  requirePositive('move angle', move.angle);
  if (move.maxSpeed !== null) requirePositive('maxSpeed', move.maxSpeed);
  requireNonNegative('lateralWeight', lateralWeight);

  const lever = part.mass * part.eccentricity;
  if (lever === 0 && lateralWeight === 0) return seat.torque / inertia;
  if (lateralWeight === 0 && move.maxSpeed === null) {
    return 1 / Math.hypot(inertia / seat.torque, (lever / seat.force) * Math.hypot(1, move.angle));
  }

  const use = (acceleration: number): number => {
    const speedSquared = Math.min(
      acceleration * move.angle,
      move.maxSpeed === null ? Infinity : move.maxSpeed ** 2,
    );
    const torque = inertia * acceleration + part.eccentricity * lateralWeight;
    const force = lever * Math.hypot(acceleration, speedSquared) + lateralWeight;
    return Math.hypot(torque / seat.torque, force / seat.force);
  };
  return largestWithin(use, seat.torque / inertia);
}

/** Largest α with use(α) ≤ 1 for an increasing function with use(high) ≥ 1, by bisection. */
function largestWithin(use: (acceleration: number) => number, high: number): number {
  if (use(0) >= 1) return 0;
  let low = 0;
  for (let step = 0; step < 200; step++) {
    const middle = (low + high) / 2;
    if (middle === low || middle === high) break;
    if (use(middle) <= 1) low = middle;
    else high = middle;
  }
  return low;
}
