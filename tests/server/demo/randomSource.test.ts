import { describe, expect, it } from 'vitest';
import { randomSource } from '../../../server/demo/randomSource.ts';

function sample(draw: () => number, n = 20_000): { mean: number; sd: number } {
  const values = Array.from({ length: n }, draw);
  const mean = values.reduce((sum, value) => sum + value, 0) / n;
  return { mean, sd: Math.sqrt(values.reduce((sum, v) => sum + (v - mean) ** 2, 0) / n) };
}

describe('random source', () => {
  it('repeats itself for a seed and differs between seeds', () => {
    const first = randomSource(7);
    const again = randomSource(7);
    const other = randomSource(8);
    const draws = Array.from({ length: 5 }, () => first.uniform());
    expect(Array.from({ length: 5 }, () => again.uniform())).toEqual(draws);
    expect(Array.from({ length: 5 }, () => other.uniform())).not.toEqual(draws);
  });

  it('has the mean and spread of its distributions', () => {
    const random = randomSource(1);
    const uniform = sample(random.uniform);
    expect(uniform.mean).toBeCloseTo(0.5, 1);
    expect(Math.abs(uniform.sd - 1 / Math.sqrt(12))).toBeLessThan(0.005);
    const normal = sample(() => random.normal(3, 2));
    expect(Math.abs(normal.mean - 3)).toBeLessThan(0.06);
    expect(Math.abs(normal.sd - 2)).toBeLessThan(0.05);
    const logistic = sample(random.logistic);
    expect(Math.abs(logistic.mean)).toBeLessThan(0.06);
    expect(Math.abs(logistic.sd - Math.PI / Math.sqrt(3))).toBeLessThan(0.05);
  });

  it('shuffles without losing anything', () => {
    const items = Array.from({ length: 50 }, (_, index) => index);
    const shuffled = randomSource(2).shuffle(items);
    expect(shuffled).not.toEqual(items);
    expect([...shuffled].sort((a, b) => a - b)).toEqual(items);
  });
});
