import { describe, expect, it } from 'vitest';
import { normalForces, vacuumForce, weightOnSeat } from '../../../shared/physics/normalForces.ts';

const none = { clampForce: 0, springForce: 0, vacuum: null };

describe('normal forces', () => {
  it('lowers the weight when the seat drops (200 N clamp, 2 kg, 2 m/s² down)', () => {
    // 215.6133 N: handbook, derived
    const [force] = normalForces(
      [{ name: 'seat', pressedBy: ['weight', 'clamp'] }],
      { ...none, clampForce: 200 },
      weightOnSeat(2, -2),
    );
    expect(force).toBeCloseTo(215.6133, 4);
  });

  it('adds pressure difference times sealed area (60 kPa on a radius of 60 mm, 2 kg)', () => {
    // 698.1973 N: handbook, derived
    const vacuum = { pressureDifference: 60_000, sealedAreaMm2: Math.PI * 60 ** 2 };
    expect(vacuumForce(vacuum) + weightOnSeat(2).axial).toBeCloseTo(698.1973, 4);
  });

  it('counts weight only on the faces it presses and clamp on each in full', () => {
    const forces = normalForces(
      [
        { name: 'seat', pressedBy: ['weight', 'clamp'] },
        { name: 'clamp pad', pressedBy: ['clamp'] },
        { name: 'spring tip', pressedBy: ['spring'] },
      ],
      { clampForce: 100, springForce: 30, vacuum: null },
      weightOnSeat(1),
    );
    expect(forces).toEqual([109.80665, 100, 30]);
  });

  it('splits the weight along and across a tilted axis', () => {
    const { axial, lateral } = weightOnSeat(2, 0, 60);
    expect(axial).toBeCloseTo(9.80665, 12);
    expect(lateral).toBeCloseTo(2 * 9.80665 * Math.sin(Math.PI / 3), 12);
    expect(weightOnSeat(2, 0, 90)).toEqual({ axial: 0, lateral: 19.6133 });
    expect(weightOnSeat(2, 0, 180)).toEqual({ axial: -19.6133, lateral: 0 });
  });

  it('subtracts the weight upside down and refuses a seat that lifts off', () => {
    const seat = [{ name: 'seat', pressedBy: ['weight' as const, 'clamp' as const] }];
    const hanging = weightOnSeat(2, 0, 180);
    expect(normalForces(seat, { ...none, clampForce: 50 }, hanging)[0]).toBeCloseTo(30.3867, 10);
    expect(() => normalForces(seat, { ...none, clampForce: 10 }, hanging)).toThrow(
      /face “seat” is -9.61 N: it lifts off/,
    );
  });

  it('refuses a weight without a mass, and a drop faster than free fall', () => {
    expect(() => normalForces([{ name: 'seat', pressedBy: ['weight'] }], none, null)).toThrow(
      /^mass is needed/,
    );
    expect(() => weightOnSeat(1, -10)).toThrow(/^verticalAcceleration must be above/);
  });
});
