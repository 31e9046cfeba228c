import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatColumn, formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { roundToDecimals } from '../../../shared/units/roundToDecimals.ts';

describe('formatting of numbers', () => {
  it('keeps three significant digits and never a decimal tail', () => {
    expect(formatQuantity(12.604918)).toBe('12.6');
    expect(formatQuantity(0.00081234)).toBe('0.000812');
    expect(formatQuantity(1412.4)).toBe('1412');
    expect(formatQuantity(9.996)).toBe('10.0');
    expect(formatQuantity(0)).toBe('0.00');
  });

  it('writes very small and very large numbers with a power of ten', () => {
    expect(formatQuantity(8.104e-6)).toBe('8.10 × 10⁻⁶');
    expect(formatQuantity(-2.5e12)).toBe('−2.50 × 10¹²');
  });

  it('has a true minus sign and no minus zero', () => {
    expect(formatQuantity(-3.14159)).toBe('−3.14');
    expect(formatQuantity(-0.0004, { decimals: 2 })).toBe('0.00');
  });

  it('shows a dash for what is not there', () => {
    expect([null, undefined, Number.NaN, Infinity].map((v) => formatQuantity(v))).toEqual(
      Array(4).fill('–'),
    );
  });

  it('rounds limits down, but leaves a limit that is on a step', () => {
    expect(formatQuantity(12.69, { rounding: 'down' })).toBe('12.6');
    expect(formatQuantity(9.4, { rounding: 'down', decimals: 1 })).toBe('9.4');
    expect(formatQuantity(0.1 + 0.2, { rounding: 'down', decimals: 1 })).toBe('0.3');
    expect(formatQuantity(8.7999999, { rounding: 'down', decimals: 2 })).toBe('8.79');
  });

  it('gives the numbers of a column the same decimals', () => {
    expect(formatColumn([41.234, 9.0761, null, 0.5])).toEqual(['41.2', '9.1', '–', '0.5']);
  });

  it('never shows more than was found when it rounds down, nor misses it by a step', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 1e5, noNaN: true }), (value) => {
        const shown = Number(formatQuantity(value, { rounding: 'down', decimals: 2 }));
        expect(shown).toBeLessThanOrEqual(value * (1 + 1e-9));
        expect(shown).toBeGreaterThan(value - 0.0100001);
      }),
    );
  });

  it('refuses decimals that are not a whole number', () => {
    expect(() => roundToDecimals(1.25, 1.5, 'nearest')).toThrow(/^decimals must be/);
  });
});
