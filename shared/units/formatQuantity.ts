import { roundToDecimals, type Rounding } from './roundToDecimals.ts';

/** Below this and from 10⁷ on a plain decimal number is hard to read. */
const smallestPlain = 1e-5;
const largestPlain = 1e7;

const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** Decimals that give a value `digits` significant digits (never negative). */
function decimalsFor(value: number, digits = 3): number {
  if (!Number.isFinite(value) || value === 0) return digits - 1;
  return Math.max(0, digits - 1 - exponentOf(value));
}

/**
 * One number as a person reads it: significant digits, a true minus sign, no unit.
 *
 * @param digits - significant digits (3); whole numbers keep all theirs
 * @param rounding - `down` for limits: what is shown never exceeds what was found
 * @param decimals - fixed decimals instead of digits, for the column of a table
 * @returns `–` for null or a number that is not finite
 */
export function formatQuantity(
  value: number | null | undefined,
  {
    digits = 3,
    rounding = 'nearest',
    decimals,
  }: { digits?: number; rounding?: Rounding; decimals?: number } = {},
): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return '–';
  const size = Math.abs(value);
  if (decimals === undefined && size > 0 && (size < smallestPlain || size >= largestPlain)) {
    const exponent = exponentOf(value);
    const mantissa = roundToDecimals(value / 10 ** exponent, digits - 1, rounding);
    return `${sign(mantissa.toFixed(digits - 1))} × 10${superscript(exponent)}`;
  }
  const places = decimals ?? decimalsFor(value, digits);
  const rounded = roundToDecimals(value, places, rounding);
  // 9.996 becomes 10.00: one digit too many unless the places are counted again
  const settled = decimals ?? Math.min(places, decimalsFor(rounded, digits));
  return sign(rounded.toFixed(settled));
}

/**
 * The numbers of one column with the same decimals, so that tabular figures align: enough for
 * `digits` significant digits of the largest value.
 */
export function formatColumn(
  values: readonly (number | null)[],
  { digits = 3, rounding = 'nearest' }: { digits?: number; rounding?: Rounding } = {},
): string[] {
  const sizes = values.filter((v): v is number => v !== null && Number.isFinite(v)).map(Math.abs);
  const decimals = decimalsFor(Math.max(0, ...sizes), digits);
  return values.map((value) => formatQuantity(value, { rounding, decimals }));
}

function exponentOf(value: number): number {
  return Number(value.toExponential().split('e')[1]);
}

function superscript(exponent: number): string {
  const digits = [...String(Math.abs(exponent))].map((d) => superscripts.charAt(Number(d)));
  return (exponent < 0 ? '⁻' : '') + digits.join('');
}

function sign(text: string): string {
  return /^-0*\.?0*$/.test(text) ? text.slice(1) : text.replace('-', '−');
}
