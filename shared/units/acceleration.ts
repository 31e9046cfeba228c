import type { accelerationUnits } from '../schemas/trialLog.ts';

export type AccelerationUnit = (typeof accelerationUnits)[number];

/** rad/s² in one unit. */
const radPerS2: Record<AccelerationUnit, number> = {
  'rad/s²': 1,
  'deg/s²': Math.PI / 180,
  'rev/s²': 2 * Math.PI,
  'rpm/s': Math.PI / 30,
};

/** An angular acceleration in rad/s². */
export function toRadPerS2(value: number, unit: AccelerationUnit): number {
  return value * radPerS2[unit];
}

/** An angular acceleration given in rad/s², in another unit. */
export function fromRadPerS2(value: number, unit: AccelerationUnit): number {
  return value / radPerS2[unit];
}
