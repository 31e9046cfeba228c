import { mean, sampleStandardDeviation } from 'simple-statistics';
import type { InclineReading } from '../schemas/frictionTest.ts';
import { toRadians } from '../units/angle.ts';
import { requireNonNegative, requirePositive } from './requireRange.ts';

/** Mean, standard deviation (null with one reading) and number of readings. */
export type FrictionStatistics = { mean: number; sd: number | null; n: number };

/** As the analysis wants it: a mean whose standard uncertainty is sd/√n with n − 1 degrees. */
export type FrictionSample = { mean: number; sd: number; n: number };

/** A source of μ: its readings, and the standard uncertainty they have in common (the gauge). */
export type FrictionSource = FrictionStatistics & { readingUncertainty: number };

/** Degrees of freedom are bounded so that a sample stays a sample. */
const mostDegrees = 100_000;

/**
 * Coefficient of friction of an incline reading: height over (horizontal) base, or the tangent of
 * the angle.
 *
 * @throws RangeError if a length is not above 0 or the angle not between 0° and 90°
 * @source ASTM G219 (tangent of the angle of the incline)
 */
export function inclineMu(reading: InclineReading): number {
  if ('angleDeg' in reading) {
    const { angleDeg } = reading;
    if (!(angleDeg > 0 && angleDeg < 90)) {
      throw new RangeError('angleDeg must be above 0 and below 90');
    }
    return Math.tan(toRadians(angleDeg));
  }
  requirePositive('heightMm', reading.heightMm);
  requirePositive('baseMm', reading.baseMm);
  return reading.heightMm / reading.baseMm;
}

/** Standard uncertainty of μ from that of the angle, rad: (1 + μ²) u(θ). */
export function inclineUncertainty(mu: number, angleUncertainty: number): number {
  requireNonNegative('mu', mu);
  requireNonNegative('angleUncertainty', angleUncertainty);
  return (1 + mu ** 2) * angleUncertainty;
}

/**
 * Mean, sample standard deviation and number.
 *
 * @throws RangeError without a value
 */
export function frictionStatistics(mus: readonly number[]): FrictionStatistics {
  const n = mus.length;
  if (n === 0) throw new RangeError('give at least one reading');
  return { mean: mean([...mus]), sd: n > 1 ? sampleStandardDeviation([...mus]) : null, n };
}

/**
 * Several tests of one kind as one sample: their readings together, so that scatter between tests
 * is in the standard deviation. Of the gauges' uncertainties the largest counts: they may share
 * their gauge, so averaging would make it look smaller than it is.
 *
 * @returns null without a test that is not excluded
 */
export function poolFrictionTests(
  tests: readonly {
    readings: readonly InclineReading[];
    readingUncertainty: number;
    excluded?: boolean;
  }[],
): FrictionSource | null {
  const kept = tests.filter((test) => !test.excluded);
  if (kept.length === 0) return null;
  return {
    ...frictionStatistics(kept.flatMap(({ readings }) => readings.map(inclineMu))),
    readingUncertainty: Math.max(...kept.map((test) => test.readingUncertainty)),
  };
}

/**
 * μ of a whole seat: the faces' own coefficients weighted by the torque each carries per unit of
 * friction, w = N r. Readings of different sources are independent; the gauge's uncertainty is
 * common and adds linearly:
 *
 *   u² = Σ w² s²/n + (Σ w u_gauge)²,  ν = u⁴ / Σ ((w² s²/n)²/(n − 1))  (rounded down)
 *
 * The answer is written as a sample with ν + 1 readings whose sd/√n is u, so that Student's t with
 * n − 1 degrees of freedom gives the right coverage. A source with one reading only has no known
 * scatter: the answer then has n = 1.
 *
 * @param sources - each with its weight, > 0; weights are normalised
 * @throws RangeError without a source or with a weight out of range
 * @source JCGM 100:2008, 5.1 and G.4 (Welch–Satterthwaite, equation G.2b)
 */
export function combineFriction(
  sources: readonly (FrictionSource & { weight: number })[],
): FrictionSample {
  if (sources.length === 0) throw new RangeError('give at least one source of friction');
  for (const { weight } of sources) requirePositive('weight', weight);
  const total = sources.reduce((sum, { weight }) => sum + weight, 0);
  const shares = sources.map(({ weight, ...source }) => ({ ...source, share: weight / total }));
  const mean = shares.reduce((sum, source) => sum + source.share * source.mean, 0);

  let scatter = 0;
  let gauge = 0;
  let inverseDegrees = 0;
  for (const { share, sd, n, readingUncertainty } of shares) {
    if (sd === null || n < 2) return { mean, sd: 0, n: 1 };
    const variance = (share * sd) ** 2 / n;
    scatter += variance;
    gauge += share * readingUncertainty;
    inverseDegrees += variance ** 2 / (n - 1);
  }
  const variance = scatter + gauge ** 2;
  const degrees =
    inverseDegrees === 0 ? smallest(shares) - 1 : Math.floor(variance ** 2 / inverseDegrees + 1e-9);
  const n = Math.min(degrees, mostDegrees) + 1;
  return { mean, sd: Math.sqrt(variance * n), n };
}

function smallest(sources: readonly { n: number }[]): number {
  return Math.min(...sources.map(({ n }) => n));
}
