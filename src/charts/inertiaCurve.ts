import { interpolateLog, type Knot } from './interpolate.ts';

/**
 * Inertia along the slide for the position picture.
 *
 * Where a configuration's inertia was measured (or its seat differs), the build-up's polynomial is
 * scaled so that the curve passes through every configuration; the factor is interpolated between
 * them. Without a polynomial the configurations alone are joined.
 *
 * @param polynomial - I(x) = Σ c[k]·x^k, x in m, kg·m²; null without a build-up
 * @param configurations - x in mm, y in kg·m² > 0; at least one
 * @returns position in mm → kg·m², or null where the polynomial is not above 0
 */
export function inertiaCurve(
  polynomial: readonly number[] | null,
  configurations: readonly Knot[],
): (positionMm: number) => number | null {
  if (polynomial === null) return (positionMm) => interpolateLog(configurations, positionMm);
  const computed = (positionMm: number) => {
    const x = positionMm / 1000;
    return polynomial.reduceRight((sum, coefficient) => sum * x + coefficient, 0);
  };
  const factors = configurations
    .filter(({ x }) => computed(x) > 0)
    .map(({ x, y }) => ({ x, y: y / computed(x) }));
  return (positionMm) => {
    const inertia = computed(positionMm);
    if (!(inertia > 0)) return null;
    return factors.length === 0 ? inertia : inertia * interpolateLog(factors, positionMm);
  };
}
