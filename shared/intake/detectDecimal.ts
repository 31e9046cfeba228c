import type { Delimiter } from './findHeader.ts';
import type { Decimal } from './parseNumber.ts';

/** A number with one comma that cannot part thousands: not exactly three digits behind it. */
const clearComma = /^[+-]?(?:[0-9]+,(?:[0-9]{1,2}|[0-9]{4,12})|0,[0-9]{3}|[0-9]{4,12},[0-9]{3})$/;
const pointed = /^[+-]?[0-9]*\.[0-9]+$/;

/**
 * Decimal sign of a log, from all its numbers together: a comma where more numbers can only have a
 * decimal comma than have a point, and commas do not separate the columns. Otherwise a point, so
 * that a stray `1,5` is refused and asked about.
 */
export function detectDecimal(values: Iterable<string>, delimiter: Delimiter): Decimal {
  if (delimiter === ',') return '.';
  let commas = 0;
  let points = 0;
  for (const value of values) {
    const text = value.trim();
    if (text.length > 40) continue;
    if (pointed.test(text)) points++;
    else if (clearComma.test(text)) commas++;
  }
  return commas > points ? ',' : '.';
}
