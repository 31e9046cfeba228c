/**
 * Guards an argument of a physical function.
 *
 * @throws RangeError naming the argument and what it must be
 */
export function requirePositive(name: string, value: number): void {
  if (!(value > 0 && Number.isFinite(value))) {
    throw new RangeError(`${name} must be a finite number above 0, not ${value}`);
  }
}

/** As `requirePositive`, with 0 allowed. */
export function requireNonNegative(name: string, value: number): void {
  if (!(value >= 0 && Number.isFinite(value))) {
    throw new RangeError(`${name} must be a finite number from 0, not ${value}`);
  }
}
