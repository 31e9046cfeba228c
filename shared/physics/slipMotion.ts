import { requireNonNegative, requirePositive } from './requireRange.ts';

/**
 * How far the part lags behind the table at most, once it slips in a triangular move with
 * κ = (kinetic limit)/α: θ(1 − κ)/(1 + κ). Constant kinetic friction, no contact loss.
 *
 * @param angle - of the move, rad, > 0
 * @param kappa - 0 … 1
 * @returns rad
 * @throws RangeError naming the argument out of range
 * @source derivation from piecewise constant acceleration; table in tests/reference
 */
export function peakLag(angle: number, kappa: number): number {
  return angle * slipShare(angle, kappa);
}

/**
 * What is left of the slip at the end of the move, after the part has coasted on:
 * θ((1 − κ)/(1 + κ))². Far smaller than the peak lag near the limit.
 *
 * @returns rad
 */
export function endMark(angle: number, kappa: number): number {
  return angle * slipShare(angle, kappa) ** 2;
}

/**
 * κ from a measured slip: an independent witness of the kinetic limit κ·α.
 *
 * @param slip - rad, 0 … angle
 * @param seenAs - the peak lag, or only the mark left at the end
 * @throws RangeError naming the argument out of range
 */
export function kappaOfSlip(angle: number, slip: number, seenAs: 'peak lag' | 'end mark'): number {
  requirePositive('angle', angle);
  requireNonNegative('slip', slip);
  if (slip > angle) throw new RangeError('slip must not exceed the move angle');
  const share = seenAs === 'peak lag' ? slip / angle : Math.sqrt(slip / angle);
  return (1 - share) / (1 + share);
}

function slipShare(angle: number, kappa: number): number {
  requirePositive('angle', angle);
  if (!(kappa >= 0 && kappa <= 1)) throw new RangeError('kappa must be from 0 to 1');
  return (1 - kappa) / (1 + kappa);
}
