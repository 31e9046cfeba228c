import type { lengthUnits } from '../schemas/trialLog.ts';

export type LengthUnit = (typeof lengthUnits)[number];

/** Millimetres in one unit; exact (1 in = 25.4 mm since 1959). */
const millimetres: Record<LengthUnit, number> = { mm: 1, cm: 10, m: 1000, in: 25.4 };

/**
 * A length in millimetres, the unit of positions on the wire. Rounded to a millionth of a
 * millimetre, so that 0.07 m is 70 mm and not 70.00000000000001 mm.
 */
export function toMillimetres(value: number, unit: LengthUnit): number {
  const mm = value * millimetres[unit];
  const rounded = Math.round(mm * 1e6) / 1e6;
  return Number.isFinite(rounded) ? rounded : mm;
}

/** A length given in millimetres, in another unit. */
export function fromMillimetres(mm: number, unit: LengthUnit): number {
  return mm / millimetres[unit];
}
