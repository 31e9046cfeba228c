import { describe, expect, it } from 'vitest';
import { effectiveRadius } from '../../../shared/physics/effectiveRadius.ts';
import { seatCapacity, seatTorque } from '../../../shared/physics/seatTorque.ts';
import type { FaceGeometry } from '../../../shared/schemas/fixture.ts';
import { expectCheckValue } from '../../reference/checkValue.ts';

function torque(mu: number, normalForce: number, geometry: FaceGeometry): number {
  return seatCapacity([{ normalForce, radius: effectiveRadius(geometry) }], [mu]).torque;
}

const annulus = { kind: 'annulus', outerRadiusMm: 50, innerRadiusMm: 30 } as const;
const disc = { kind: 'disc', radiusMm: 50 } as const;
const clutch = { kind: 'annulus', outerRadiusMm: 125, innerRadiusMm: 87.5 } as const;

describe('torque of a seat', () => {
  it('agrees with the simple faces of the handbook (μ 0.3, 500 N)', () => {
    expectCheckValue('torque.ring', torque(0.3, 500, { kind: 'ring', radiusMm: 40 }));
    expectCheckValue(
      'torque.disc_up',
      torque(0.3, 500, { ...disc, pressureLaw: 'uniform pressure' }),
    );
    expectCheckValue('torque.disc_uw', torque(0.3, 500, { ...disc, pressureLaw: 'uniform wear' }));
    expectCheckValue(
      'torque.annulus_up_reff',
      effectiveRadius({ ...annulus, pressureLaw: 'uniform pressure' }),
    );
    expect(torque(0.3, 500, { kind: 'pads', radiusMm: 60, count: 3 })).toBeCloseTo(9, 12);
  });

  it('agrees with a textbook clutch of 250 × 175 mm', () => {
    expectCheckValue(
      'clutch.shigley250x175.uw_T',
      torque(0.3, 4000, { ...clutch, pressureLaw: 'uniform wear' }),
    );
    expectCheckValue(
      'clutch.shigley250x175.up_T',
      torque(0.3, 4000, { ...clutch, pressureLaw: 'uniform pressure' }),
    );
  });

  it('agrees with a textbook clutch of six faces, 6.5 × 4 in', () => {
    const pressure = 120; // psi at the inner rim, uniform wear: F = π p d (D − d) / 2
    const force = (Math.PI * pressure * 4 * (6.5 - 4)) / 2;
    expectCheckValue('clutch.6.5x4in.F_lbf', force);
    const radius = effectiveRadius({
      kind: 'annulus',
      outerRadiusMm: 6.5 / 2,
      innerRadiusMm: 4 / 2,
      pressureLaw: 'uniform wear',
    });
    // a length in inches passes through as "mm", so the answer is in thousandths of lbf·in
    const face = { normalForce: force, radius };
    const six = seatCapacity(Array(6).fill(face), Array(6).fill(0.24)).torque;
    expectCheckValue('clutch.6.5x4in_6planes.T_lbfin', six * 1000);
  });

  it('agrees with a clutch exercise of 200 × 140 mm and two faces', () => {
    const force = 2 * Math.PI * 1e6 * 0.07 * (0.1 - 0.07);
    const radius = effectiveRadius({
      kind: 'annulus',
      outerRadiusMm: 100,
      innerRadiusMm: 70,
      pressureLaw: 'uniform wear',
    });
    const face = { normalForce: force, radius };
    expectCheckValue('clutch.140x200.uw_T', seatCapacity([face, face], [0.5, 0.5]).torque);
  });

  it('adds faces of unequal friction and load: clamp above, clamp and weight below', () => {
    // μ 0.15, 1200 N, 45 mm on both faces: 16.2 N·m; 3 kg more on the lower: 16.3985847 (handbook)
    const upper = { normalForce: 1200, radius: 0.045 };
    const lower = { normalForce: 1200 + 3 * 9.80665, radius: 0.045 };
    expect(seatCapacity([upper, upper], [0.15, 0.15]).torque).toBeCloseTo(16.2, 12);
    expect(seatCapacity([upper, lower], [0.15, 0.15]).torque).toBeCloseTo(16.3985847, 7);
    expect(seatCapacity([upper, lower], [0.15, 0.3])).toEqual({
      torque: 0.15 * 1200 * 0.045 + 0.3 * lower.normalForce * 0.045,
      force: 0.15 * 1200 + 0.3 * lower.normalForce,
    });
  });

  it('is Σ N r and Σ N per unit of friction', () => {
    const { torque: perMu, force } = seatTorque([
      { normalForce: 100, radius: 0.05 },
      { normalForce: 40, radius: 0.1 },
    ]);
    expect(perMu).toBeCloseTo(9, 12);
    expect(force).toBe(140);
  });

  it('tends to the ring when the inner radius of an annulus reaches the outer', () => {
    const thin = { kind: 'annulus', outerRadiusMm: 50, innerRadiusMm: 50 - 1e-9 } as const;
    expect(effectiveRadius({ ...thin, pressureLaw: 'uniform pressure' })).toBeCloseTo(0.05, 10);
    expect(effectiveRadius({ ...thin, pressureLaw: 'uniform wear' })).toBeCloseTo(0.05, 10);
  });

  it('refuses a missing friction coefficient and a negative force by name', () => {
    const face = { normalForce: 1, radius: 1 };
    expect(() => seatCapacity([face], [])).toThrow(/^mus must hold/);
    expect(() => seatCapacity([{ ...face, normalForce: -1 }], [1])).toThrow(/^normalForce must/);
    expect(() =>
      effectiveRadius({ ...annulus, innerRadiusMm: 60, pressureLaw: 'uniform wear' }),
    ).toThrow(/^innerRadiusMm must be below/);
  });
});
