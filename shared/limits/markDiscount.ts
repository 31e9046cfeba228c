import type { ConfigurationData } from '../boundary/collect.ts';

/** Whether some trials of a configuration were judged by the mark left or by eye. */
export function judgedByMark(configuration: ConfigurationData): boolean {
  return configuration.trials.some(
    (trial) => trial.judgedBy === 'end mark' || trial.judgedBy === 'by eye',
  );
}

/**
 * Discount on a demonstrated limit whose trials were judged by end mark or by eye: a part that
 * slips at κ = limit/α leaves only θ((1 − κ)/(1 + κ))², so slips up to (1 + s)/(1 − s) above the
 * limit may have gone unseen, s = √(φ_min/θ).
 *
 * @param visible - moveAngle θ and smallestVisibleSlip φ_min, rad
 * @returns (1 − s)/(1 + s), 1 where nothing was judged so, null where θ or φ_min is missing or no
 * slip could have been seen
 * @source end mark of a triangular move, methods page, section 1 ("What a slip looks like")
 */
export function markDiscount(
  configuration: ConfigurationData,
  visible: { moveAngle?: number | undefined; smallestVisibleSlip?: number | undefined },
): number | null {
  if (!judgedByMark(configuration)) return 1;
  const { moveAngle, smallestVisibleSlip } = visible;
  if (moveAngle === undefined || smallestVisibleSlip === undefined) return null;
  const s = Math.sqrt(smallestVisibleSlip / moveAngle);
  return s < 1 ? (1 - s) / (1 + s) : null;
}
