const steps: readonly number[][] = [
  [1],
  [1, 3],
  [1, 2, 5],
  [1, 1.5, 2, 3, 5, 7],
  [1, 1.2, 1.4, 1.6, 1.8, 2, 2.5, 3, 3.5, 4, 5, 6, 7, 8, 9],
];

/**
 * Round marks of a logarithmic axis: the coarsest of a few step patterns that still gives at
 * least `wanted` marks.
 *
 * @param from - lower end of the axis, > 0
 * @param to - upper end, > from
 */
export function logTicks(from: number, to: number, wanted = 4): number[] {
  if (!(from > 0) || !(to > from))
    throw new RangeError('a logarithmic axis runs from above 0 upwards');
  let marks: number[] = [];
  for (const pattern of steps) {
    marks = marksOf(pattern, from, to);
    if (marks.length >= wanted) break;
  }
  return marks;
}

function marksOf(pattern: readonly number[], from: number, to: number): number[] {
  const marks: number[] = [];
  for (
    let decade = Math.floor(Math.log10(from));
    decade <= Math.ceil(Math.log10(to));
    decade += 1
  ) {
    for (const step of pattern) {
      const mark = Number(`${step}e${decade}`);
      if (mark >= from && mark <= to) marks.push(mark);
    }
  }
  return marks;
}

/** A power of ten whose exponent is a multiple of 3, so that axis numbers stay short. */
export interface EngineeringScale {
  factor: number;
  /** `''` or `10⁻³ `, to stand before the unit */
  prefix: string;
}

const superscripts: Record<string, string> = {
  '-': '⁻',
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
};

/** The scale on which a number of this size reads as 0.1 … 99; @param size > 0 */
export function engineeringScale(size: number): EngineeringScale {
  if (!(size > 0) || !Number.isFinite(size)) throw new RangeError('a scale needs a size above 0');
  const exponent = 3 * Math.floor((Math.log10(size) + 1) / 3);
  if (exponent === 0) return { factor: 1, prefix: '' };
  const written = [...String(exponent)].map((sign) => superscripts[sign] ?? sign).join('');
  return { factor: 10 ** exponent, prefix: `10${written} ` };
}

/** An axis number without trailing zeros, with a true minus sign. */
export function tickLabel(value: number): string {
  return String(Number(value.toPrecision(3))).replace('-', '−');
}
