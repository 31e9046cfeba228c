import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fromRadPerS2, toRadPerS2 } from '../../../shared/units/acceleration.ts';
import { fromRadians, toRadians } from '../../../shared/units/angle.ts';
import { fromMillimetres, toMillimetres } from '../../../shared/units/length.ts';
import { accelerationUnits, angleUnits, lengthUnits } from '../../../shared/schemas/trialLog.ts';

describe('units', () => {
  it('converts accelerations as the handbook does', () => {
    // 300 rad/s² = 17188.73 deg/s² = 2864.79 rpm/s (handbook 2.4)
    expect(fromRadPerS2(300, 'deg/s²')).toBeCloseTo(17188.73, 2);
    expect(fromRadPerS2(300, 'rpm/s')).toBeCloseTo(2864.79, 2);
    expect(toRadPerS2(1, 'rev/s²')).toBe(2 * Math.PI);
    expect(toRadPerS2(60, 'rpm/s')).toBeCloseTo(2 * Math.PI, 14);
  });

  it('converts lengths without a binary tail', () => {
    expect(toMillimetres(0.07, 'm')).toBe(70);
    expect(toMillimetres(7.5, 'cm')).toBe(75);
    expect(toMillimetres(1, 'in')).toBe(25.4);
  });

  it('takes half a turn for π', () => {
    expect(toRadians(180)).toBe(Math.PI);
    expect(fromRadians(Math.PI)).toBe(180);
  });

  it('gives every value back in every unit', () => {
    const value = fc.double({ min: 0.001, max: 1e4, noNaN: true });
    fc.assert(
      fc.property(value, (v) => {
        for (const unit of lengthUnits) {
          expect(Math.abs(toMillimetres(fromMillimetres(v, unit), unit) - v)).toBeLessThan(1e-6);
        }
        for (const unit of accelerationUnits) {
          expect(toRadPerS2(fromRadPerS2(v, unit), unit) / v).toBeCloseTo(1, 13);
        }
        for (const unit of angleUnits) {
          expect(toRadians(fromRadians(v, unit), unit) / v).toBeCloseTo(1, 13);
        }
      }),
    );
  });
});
