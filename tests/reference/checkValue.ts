import { expect } from 'vitest';
import entries from './check-values.json' with { type: 'json' };

/**
 * Compares a result with an outside value of check-values.json, within the tolerance given there
 * (absolute; never below what double precision can hold).
 */
export function expectCheckValue(id: string, actual: number): void {
  const entry = entries.find((candidate) => candidate.id === id);
  if (!entry) throw new Error(`no check value ${id}`);
  const tolerance = Math.max(entry.tol, Math.abs(entry.value) * 1e-13);
  expect(
    Math.abs(actual - entry.value),
    `${id}: ${actual}, not ${entry.value}`,
  ).toBeLessThanOrEqual(tolerance);
}
