import type { Face, Fixture, Load } from '../schemas/fixture.ts';
import { toRadians } from '../units/angle.ts';
import { standardGravity } from './gravity.ts';
import { requireNonNegative, requirePositive } from './requireRange.ts';

type Hold = Fixture['hold'];

/** Along the axis (pressing the seat, negative when it pulls off) and across it, N. */
export type Weight = { axial: number; lateral: number };

/**
 * Weight on a seat whose axis leans by `tiltDeg` from the vertical, in a frame that accelerates
 * upwards: m (g + a) cos β presses, m (g + a) sin β pulls sideways. About a tilted axis cos β
 * does not change while the part turns, so this is its minimum over the move too.
 *
 * @param mass - kg, > 0
 * @param verticalAcceleration - m/s², up positive, above −g
 * @param tiltDeg - 0 (vertical) … 180 (upside down)
 * @throws RangeError naming the argument out of range
 */
export function weightOnSeat(mass: number, verticalAcceleration = 0, tiltDeg = 0): Weight {
  requirePositive('mass', mass);
  if (!(verticalAcceleration > -standardGravity && Number.isFinite(verticalAcceleration))) {
    throw new RangeError('verticalAcceleration must be above −9.80665 m/s²: the part would float');
  }
  if (!(tiltDeg >= 0 && tiltDeg <= 180)) throw new RangeError('tiltDeg must be from 0 to 180');
  const weight = mass * (standardGravity + verticalAcceleration);
  // cos 90° and sin 180° are exactly 0, not 6e-17
  const axial = tiltDeg === 90 ? 0 : weight * Math.cos(toRadians(tiltDeg));
  const lateral = tiltDeg === 0 || tiltDeg === 180 ? 0 : weight * Math.sin(toRadians(tiltDeg));
  return { axial, lateral };
}

/** Force of the vacuum, Δp · sealed area, N. */
export function vacuumForce({ pressureDifference, sealedAreaMm2 }: NonNullable<Hold['vacuum']>) {
  requirePositive('pressureDifference', pressureDifference);
  requirePositive('sealedAreaMm2', sealedAreaMm2);
  return (pressureDifference * sealedAreaMm2) / 1e6;
}

/**
 * Normal force on every face of a seat, in the order given. A load that presses several faces
 * presses each in full: they are in series (seat below, clamp pad above). Weight counts only on
 * the faces it presses, and pulls there when the axis leans beyond the horizontal.
 *
 * @param weight - on the seat; null when no mass is known
 * @returns N, each ≥ 0
 * @throws RangeError if the weight is needed and unknown, or a face is pulled off its seat
 */
export function normalForces(
  faces: readonly Pick<Face, 'name' | 'pressedBy'>[],
  hold: Pick<Hold, 'clampForce' | 'springForce' | 'vacuum'>,
  weight: Weight | null,
): number[] {
  requireNonNegative('clampForce', hold.clampForce);
  requireNonNegative('springForce', hold.springForce);
  const forceOf = (load: Load): number => {
    switch (load) {
      case 'weight':
        if (!weight) {
          throw new RangeError('mass is needed: give the held mass or the bodies of the build-up');
        }
        return weight.axial;
      case 'clamp':
        return hold.clampForce;
      case 'spring':
        return hold.springForce;
      case 'vacuum':
        return hold.vacuum ? vacuumForce(hold.vacuum) : 0;
    }
  };
  return faces.map(({ name, pressedBy }) => {
    const force = [...new Set(pressedBy)].reduce((sum, load) => sum + forceOf(load), 0);
    if (force < 0) {
      throw new RangeError(`normal force on face “${name}” is ${force.toFixed(2)} N: it lifts off`);
    }
    return force;
  });
}
