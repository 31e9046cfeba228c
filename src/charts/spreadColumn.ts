/**
 * Sideways steps that keep marks of one column from hiding each other: marks closer together
 * than `bin` stand side by side, in the order they came. The column's middle stays free for the fit.
 *
 * @param heights - where the marks stand along the column, on the drawn (log or linear) scale
 * @param bin - how close two marks may be before they would cover each other, same scale, > 0
 * @returns one whole number a mark: 1, −1, 2, −2 …
 */
export function spreadColumn(heights: readonly number[], bin: number): number[] {
  if (!(bin > 0)) throw new RangeError('bin must be above 0');
  const order = heights
    .map((_, index) => index)
    .sort((a, b) => at(heights, a) - at(heights, b) || a - b);
  const steps = new Array<number>(heights.length).fill(0);
  let start = Number.NEGATIVE_INFINITY;
  let count = 0;
  for (const index of order) {
    const height = at(heights, index);
    if (height - start >= bin) {
      start = height;
      count = 0;
    }
    const lane = Math.floor(count / 2) + 1;
    steps[index] = count % 2 === 0 ? lane : -lane;
    count += 1;
  }
  return steps;
}

function at(values: readonly number[], index: number): number {
  return values[index] ?? Number.NaN;
}
