import type { angleUnits } from '../schemas/trialLog.ts';

export type AngleUnit = (typeof angleUnits)[number];

/** Radians in one unit. */
const radians: Record<AngleUnit, number> = { rad: 1, '°': Math.PI / 180 };

/** An angle in radians. */
export function toRadians(value: number, unit: AngleUnit = '°'): number {
  return value * radians[unit];
}

/** An angle given in radians, in another unit. */
export function fromRadians(value: number, unit: AngleUnit = '°'): number {
  return value / radians[unit];
}
