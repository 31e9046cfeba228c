/** Repeatable random numbers for invented data; the same seed gives the same data for ever. */
export type RandomSource = {
  /** Uniform in (0, 1). */
  uniform: () => number;
  normal: (mean: number, sd: number) => number;
  /** Logistic with median 0 and the scale 1: the scatter of a logit boundary. */
  logistic: () => number;
  shuffle: <T>(items: readonly T[]) => T[];
};

/**
 * A source of random numbers from a seed, a whole number.
 *
 * @source splitmix32 (Steele, Lea & Flood 2014, in its 32-bit form); Box & Muller 1958
 */
export function randomSource(seed: number): RandomSource {
  let state = seed >>> 0;
  const uniform = (): number => {
    state = (state + 0x9e3779b9) >>> 0;
    let mixed = state ^ (state >>> 16);
    mixed = Math.imul(mixed, 0x21f0aaad);
    mixed ^= mixed >>> 15;
    mixed = Math.imul(mixed, 0x735a2d97);
    mixed ^= mixed >>> 15;
    return ((mixed >>> 0) + 0.5) / 2 ** 32;
  };
  return {
    uniform,
    normal: (mean, sd) =>
      mean + sd * Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform()),
    logistic: () => {
      const share = uniform();
      return Math.log(share / (1 - share));
    },
    shuffle: (items) =>
      items
        .map((item) => ({ item, key: uniform() }))
        .sort((a, b) => a.key - b.key)
        .map(({ item }) => item),
  };
}
