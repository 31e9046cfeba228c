import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { moveTime, partsPerHour, peakSpeed } from '../../../shared/physics/moveTime.ts';
import { expectCheckValue } from '../../reference/checkValue.ts';

const free = { maxSpeed: null, maxJerk: null };

describe('move time', () => {
  it('agrees with the triangular move of the handbook (180°, 20 rad/s²)', () => {
    expectCheckValue('motion.T_180_20', moveTime(Math.PI, 20));
    expectCheckValue('motion.wpk_180_20', peakSpeed(Math.PI, 20, free));
    expectCheckValue('motion.pph_dwell1.5', partsPerHour(moveTime(Math.PI, 20), 1.5));
  });

  it('agrees with the trapezoid of the handbook', () => {
    expectCheckValue('motion.trap_w5_T', moveTime(Math.PI, 20, { ...free, maxSpeed: 5 }));
    // 3 rad/s: 1.19719755 s (handbook, derived)
    expect(moveTime(Math.PI, 20, { ...free, maxSpeed: 3 })).toBeCloseTo(1.19719755, 8);
  });

  it('agrees with the S-curve of the handbook (400 rad/s³)', () => {
    // T 0.84424085 s, peak speed 7.44240852 rad/s (handbook, derived)
    const limits = { maxSpeed: null, maxJerk: 400 };
    expect(moveTime(Math.PI, 20, limits)).toBeCloseTo(0.84424085, 8);
    expect(peakSpeed(Math.PI, 20, limits)).toBeCloseTo(7.44240852, 8);
  });

  it('is ∛(32θ/J) when the acceleration is never reached', () => {
    const limits = { maxSpeed: null, maxJerk: 10 };
    expect(moveTime(Math.PI, 1000, limits)).toBeCloseTo(Math.cbrt((32 * Math.PI) / 10), 12);
  });

  it('is continuous where each limit begins to bind', () => {
    const jerk = 400;
    const border = Math.sqrt((Math.PI * jerk * jerk) / 2 / jerk) ** (2 / 3);
    for (const acceleration of [border, 20]) {
      const limits = { maxSpeed: null, maxJerk: jerk };
      const below = moveTime(Math.PI, acceleration * (1 - 1e-9), limits);
      const above = moveTime(Math.PI, acceleration * (1 + 1e-9), limits);
      expect(Math.abs(above - below)).toBeLessThan(1e-6);
      const peak = peakSpeed(Math.PI, acceleration, limits);
      const capped = moveTime(Math.PI, acceleration, { ...limits, maxSpeed: peak * (1 - 1e-9) });
      expect(capped).toBeCloseTo(moveTime(Math.PI, acceleration, limits), 6);
    }
  });

  it('tends to the triangular move as the jerk grows, and every limit only costs time', () => {
    const value = fc.double({ min: 0.1, max: 100, noNaN: true });
    fc.assert(
      fc.property(value, value, value, value, (angle, acceleration, maxSpeed, jerk) => {
        const fastest = moveTime(angle, acceleration);
        expect(moveTime(angle, acceleration, { maxSpeed: null, maxJerk: 1e12 })).toBeCloseTo(
          fastest,
          6,
        );
        const jerky = moveTime(angle, acceleration, { maxSpeed: null, maxJerk: jerk });
        const slow = moveTime(angle, acceleration, { maxSpeed, maxJerk: jerk });
        expect(jerky).toBeGreaterThanOrEqual(fastest * (1 - 1e-12));
        expect(slow).toBeGreaterThanOrEqual(jerky * (1 - 1e-12));
      }),
    );
  });

  it('refuses arguments out of range by name', () => {
    expect(() => moveTime(0, 1)).toThrow(/^angle must be/);
    expect(() => moveTime(1, -1)).toThrow(/^acceleration must be/);
    expect(() => moveTime(1, 1, { maxSpeed: null, maxJerk: 0 })).toThrow(/^maxJerk must be/);
    expect(() => partsPerHour(1, -1)).toThrow(/^dwell must be/);
  });
});
