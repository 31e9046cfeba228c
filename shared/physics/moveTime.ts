import { requireNonNegative, requirePositive } from './requireRange.ts';

/** Limits of a drive; null = never reached. Speed rad/s, jerk rad/s³. */
export type DriveLimits = { maxSpeed: number | null; maxJerk: number | null };

/**
 * Shortest rest-to-rest time of a symmetric move: triangular 2√(θ/α); with a speed cap
 * θ/ω + ω/α; with a jerk limit the S-curve.
 *
 * @param angle - rad, > 0
 * @param acceleration - rad/s², > 0
 * @returns s
 * @throws RangeError naming the argument out of range
 * @source constant-acceleration and S-curve kinematics (closed form)
 */
export function moveTime(
  angle: number,
  acceleration: number,
  { maxSpeed, maxJerk }: DriveLimits = { maxSpeed: null, maxJerk: null },
): number {
  requirePositive('angle', angle);
  requirePositive('acceleration', acceleration);
  if (maxSpeed !== null) {
    requirePositive('maxSpeed', maxSpeed);
    const ramp = rampTime(maxSpeed, acceleration, maxJerk);
    if (angle >= maxSpeed * ramp) return angle / maxSpeed + ramp;
  }
  return 2 * halfTime(angle, acceleration, maxJerk);
}

/** Highest speed of a move, rad/s: 2θ/T without a cruise, else the cap. */
export function peakSpeed(angle: number, acceleration: number, limits: DriveLimits): number {
  const free = (2 * angle) / moveTime(angle, acceleration, { ...limits, maxSpeed: null });
  return limits.maxSpeed === null ? free : Math.min(free, limits.maxSpeed);
}

/**
 * Throughput of an indexing fixture.
 *
 * @param time - of one move, s, > 0
 * @param dwell - at rest between two moves, s, ≥ 0
 * @param parts - finished per move
 */
export function partsPerHour(time: number, dwell: number, parts = 1): number {
  requirePositive('time', time);
  requireNonNegative('dwell', dwell);
  requirePositive('parts', parts);
  return (3600 * parts) / (time + dwell);
}

/** Time to reach a speed from rest; the mean speed on the way is half of it. */
function rampTime(speed: number, acceleration: number, jerk: number | null): number {
  if (jerk === null) return speed / acceleration;
  requirePositive('maxJerk', jerk);
  return speed >= acceleration ** 2 / jerk
    ? speed / acceleration + acceleration / jerk
    : 2 * Math.sqrt(speed / jerk);
}

/** Half the time of a move without a cruise. */
function halfTime(angle: number, acceleration: number, jerk: number | null): number {
  if (jerk === null) return Math.sqrt(angle / acceleration);
  requirePositive('maxJerk', jerk);
  const jerkTime = acceleration / jerk;
  const half = (jerkTime + Math.sqrt(jerkTime ** 2 + (4 * angle) / acceleration)) / 2;
  // below this the move ends before the acceleration is reached
  return half >= 2 * jerkTime ? half : Math.cbrt((32 * angle) / jerk) / 2;
}
