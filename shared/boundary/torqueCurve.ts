import { PowerRegression } from 'ml-regression';

export type TorqueCurve = {
  /** N·m: the torque at an inertia of 1 kg·m². */
  torque: number;
  /** Slope of ln α₅₀ over ln I; theory's τ/I has −1. */
  slope: number;
};

/**
 * The torque curve as the data show it: ln α₅₀ regressed on ln I over the configurations, each
 * counted once. A quick look for engineers, without intervals; the power model's exponent judges.
 *
 * @param points - inertia kg·m² and half-slip acceleration rad/s² of each configuration, > 0
 * @returns null with fewer than two different inertias
 * @throws RangeError if a value is not above 0
 * @source ordinary least squares on logarithms (power law of ml-regression)
 */
export function torqueCurve(
  points: readonly { inertia: number; alpha50: number }[],
): TorqueCurve | null {
  for (const { inertia, alpha50 } of points) {
    if (!(inertia > 0 && alpha50 > 0)) throw new RangeError('inertia and alpha50 must be above 0');
  }
  if (new Set(points.map(({ inertia }) => inertia)).size < 2) return null;
  const { A, B } = new PowerRegression(
    points.map(({ inertia }) => inertia),
    points.map(({ alpha50 }) => alpha50),
  );
  return { torque: A, slope: B };
}
