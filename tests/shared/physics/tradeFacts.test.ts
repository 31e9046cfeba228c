import { describe, expect, it } from 'vitest';
import { effectiveRadius } from '../../../shared/physics/effectiveRadius.ts';
import { weightOnSeat } from '../../../shared/physics/normalForces.ts';
import { seatCapacity } from '../../../shared/physics/seatTorque.ts';
import { theoryLimit } from '../../../shared/physics/theoryLimit.ts';

// Facts of the trade: common practice, no source.
describe('facts of the trade (common practice)', () => {
  const weight = weightOnSeat(0.1625).axial;
  const radius = effectiveRadius({ kind: 'ring', radiusMm: 26 });
  const { torque, force } = seatCapacity([{ normalForce: weight, radius }], [0.21]);

  it('a part of 0.1625 kg weighs 1.59 N', () => {
    expect(weight.toFixed(2)).toBe('1.59');
  });

  it('friction of 0.21 carries 0.33 N of it', () => {
    expect(force.toFixed(2)).toBe('0.33');
  });

  it('at 26 mm that is 0.0087 N·m', () => {
    expect(torque.toFixed(4)).toBe('0.0087');
  });

  it('a margin of 40 % leaves 0.0052 N·m', () => {
    expect(((1 - 0.4) * torque).toFixed(4)).toBe('0.0052');
  });

  it('certain slip over safe acceleration is the same in every configuration', () => {
    // both are torques over the same inertia; 23.5/7.94 and 62/21 agree within rounding
    const ratio = (certain: number, safe: number) =>
      theoryLimit(safe, { torque: certain, force: 1 }) /
      theoryLimit(safe, { torque: safe, force: 1 });
    expect(ratio(23.5, 7.94).toFixed(2)).toBe('2.96');
    expect(ratio(62, 21).toFixed(2)).toBe('2.95');
    const safeTorque = (1 - 0.4) * torque;
    const certainTorque = (23.5 / 7.94) * safeTorque;
    for (const inertia of [2.2e-4, 5.5e-4, 8.3e-4]) {
      const safe = theoryLimit(inertia, { torque: safeTorque, force });
      const certain = theoryLimit(inertia, { torque: certainTorque, force });
      expect(certain / safe).toBeCloseTo(23.5 / 7.94, 12);
      expect(Math.abs(certain / safe - 62 / 21)).toBeLessThan(0.01);
    }
  });
});
