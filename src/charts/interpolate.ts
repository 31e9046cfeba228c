/** A point of a curve given by few points. */
export interface Knot {
  x: number;
  y: number;
}

/**
 * Piecewise between the knots: ln y linear in x, level beyond the ends.
 *
 * @param knots - at least one, every y > 0
 */
export function interpolateLog(knots: readonly Knot[], x: number): number {
  const sorted = [...knots].sort((a, b) => a.x - b.x);
  const first = sorted[0];
  const last = sorted.at(-1);
  if (first === undefined || last === undefined)
    throw new RangeError('a curve needs at least one point');
  if (x <= first.x) return first.y;
  if (x >= last.x) return last.y;
  const right = sorted.findIndex((knot) => knot.x >= x);
  const b = sorted[right] ?? last;
  const a = sorted[right - 1] ?? first;
  const share = b.x === a.x ? 0 : (x - a.x) / (b.x - a.x);
  return Math.exp(Math.log(a.y) + share * (Math.log(b.y) - Math.log(a.y)));
}
