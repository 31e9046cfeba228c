export type Rounding = 'nearest' | 'down' | 'up';

/** Relative room for values such as 9.4 that binary numbers miss by a hair. */
const tie = 1e-9;

/**
 * A number rounded to decimal places. `down` (towards −∞) is for limits: a limit of 12.68 shown
 * with one decimal is 12.6. A value within 1e-9 (relative) of a step counts as on it.
 *
 * @throws RangeError if decimals is not a whole number from 0 to 15
 */
export function roundToDecimals(value: number, decimals: number, rounding: Rounding): number {
  if (!Number.isInteger(decimals) || decimals < 0 || decimals > 15) {
    throw new RangeError('decimals must be a whole number from 0 to 15');
  }
  const scale = 10 ** decimals;
  const scaled = value * scale;
  if (!Number.isFinite(scaled) || Number.isInteger(scaled)) return value;
  const room = Math.abs(scaled) * tie;
  const steps =
    rounding === 'down'
      ? Math.floor(scaled + room)
      : rounding === 'up'
        ? Math.ceil(scaled - room)
        : Math.round(scaled);
  return steps / scale;
}
