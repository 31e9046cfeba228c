import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { theoryLimit } from '../../../shared/physics/theoryLimit.ts';
import { equivalentTorque } from '../../../shared/physics/equivalentTorque.ts';
import { expectCheckValue } from '../../reference/checkValue.ts';

const seat = { torque: 6, force: 150 };
const part = { mass: 2, eccentricity: 0.05 };
const aboutCentre = 0.02;
const inertia = aboutCentre + part.mass * part.eccentricity ** 2;
const halfTurn = { angle: Math.PI, maxSpeed: null };

describe('theory limit', () => {
  it('is τ/I for a centred part', () => {
    expectCheckValue('limit.alpha_I0.03', theoryLimit(0.03, seat));
    expectCheckValue('ecc.e50mm_tau_over_IG', theoryLimit(aboutCentre, seat));
    expectCheckValue('ecc.e50mm_tau_over_Io', theoryLimit(inertia, seat));
  });

  it('falls on the ellipse for an off-centre part, most in a long move', () => {
    expectCheckValue('ecc.e50mm_triangular_180deg', theoryLimit(inertia, seat, part, halfTurn));
    // with hardly any move the speed never rises: the ellipse at rest
    const atRest = theoryLimit(inertia, seat, part, { angle: 1e-9, maxSpeed: null });
    expectCheckValue('ecc.e50mm_ellipsoid_rest', atRest);
  });

  it('agrees with the other eccentricities of the handbook', () => {
    // 20 mm: 279.6098; 10 mm: 294.5296, over 90° 296.2253 (handbook, derived)
    const limit = (eccentricity: number, angle: number) =>
      theoryLimit(
        aboutCentre + 2 * eccentricity ** 2,
        seat,
        { mass: 2, eccentricity },
        { angle, maxSpeed: null },
      );
    expect(limit(0.02, Math.PI)).toBeCloseTo(279.6098, 4);
    expect(limit(0.01, Math.PI)).toBeCloseTo(294.5296, 4);
    expect(limit(0.01, Math.PI / 2)).toBeCloseTo(296.2253, 4);
  });

  it('under a speed cap satisfies the ellipse at the end of the ramp', () => {
    const maxSpeed = 15;
    const limit = theoryLimit(inertia, seat, part, { angle: Math.PI, maxSpeed });
    const lever = part.mass * part.eccentricity;
    // closed form at fixed ω: √((1 − (m e ω²/F)²) / ((m e/F)² + (I/τ)²)) (handbook 2.6)
    const closed = Math.sqrt(
      (1 - ((lever * maxSpeed ** 2) / seat.force) ** 2) /
        ((lever / seat.force) ** 2 + (inertia / seat.torque) ** 2),
    );
    expect(limit).toBeCloseTo(closed, 9);
    expect(limit).toBeGreaterThan(theoryLimit(inertia, seat, part, halfTurn));
  });

  it('does not change when the speed cap is never reached', () => {
    const free = theoryLimit(inertia, seat, part, halfTurn);
    const maxSpeed = Math.sqrt(free * Math.PI) * 1.001;
    expect(theoryLimit(inertia, seat, part, { angle: Math.PI, maxSpeed })).toBeCloseTo(free, 9);
  });

  it('loses sideways weight and its torque on a tilted axis', () => {
    const weight = 20;
    const limit = theoryLimit(inertia, seat, part, halfTurn, weight);
    const lever = part.mass * part.eccentricity;
    const torque = inertia * limit + part.eccentricity * weight;
    const force = lever * limit * Math.hypot(1, Math.PI) + weight;
    expect((torque / seat.torque) ** 2 + (force / seat.force) ** 2).toBeCloseTo(1, 9);
  });

  it('is 0 when the part slides at rest', () => {
    expect(theoryLimit(inertia, seat, { mass: 2, eccentricity: 0 }, halfTurn, 150)).toBe(0);
  });

  it('never exceeds τ/I and scales with the capacity', () => {
    const value = fc.double({ min: 0.01, max: 100, noNaN: true });
    fc.assert(
      fc.property(value, value, value, value, value, (I, torque, force, mass, angle) => {
        const held = { mass, eccentricity: 0.05 };
        const move = { angle, maxSpeed: null };
        const limit = theoryLimit(I, { torque, force }, held, move);
        expect(limit).toBeLessThanOrEqual((torque / I) * (1 + 1e-12));
        const double = theoryLimit(I, { torque: 2 * torque, force: 2 * force }, held, move);
        expect(double / limit).toBeCloseTo(2, 10);
      }),
    );
  });

  it('refuses arguments out of range by name', () => {
    expect(() => theoryLimit(0, seat)).toThrow(/^inertia must be/);
    expect(() => theoryLimit(1, { torque: 0, force: 1 })).toThrow(/^torque must be/);
    expect(() => theoryLimit(1, seat, { mass: 1, eccentricity: -1 })).toThrow(/^eccentricity must/);
    expect(() => theoryLimit(1, seat, part, { angle: 0, maxSpeed: null })).toThrow(/^move angle/);
    expect(() => theoryLimit(1, seat, part, { angle: 1, maxSpeed: 0 })).toThrow(/^maxSpeed must/);
  });
});

describe('equivalent torque of a configuration', () => {
  const perMu = { torque: 20, force: 500 };

  it('is Σ N r for a centred part', () => {
    const found = equivalentTorque(inertia, perMu, 0.3, { mass: 2, eccentricity: 0 }, halfTurn);
    expect(found).toEqual({ torquePerMu: 20, proportional: true });
  });

  it('gives back the theory limit as μ·T/I at any μ when no speed cap binds', () => {
    const { torquePerMu, proportional } = equivalentTorque(inertia, perMu, 0.3, part, halfTurn);
    expect(proportional).toBe(true);
    expectCheckValue('ecc.e50mm_triangular_180deg', (0.3 * torquePerMu) / inertia);
    const other = theoryLimit(inertia, { torque: 0.2 * 20, force: 0.2 * 500 }, part, halfTurn);
    expect((0.2 * torquePerMu) / inertia).toBeCloseTo(other, 9);
  });

  it('says so when a speed cap breaks proportionality', () => {
    const move = { angle: Math.PI, maxSpeed: 15 };
    const { torquePerMu, proportional } = equivalentTorque(inertia, perMu, 0.3, part, move);
    expect(proportional).toBe(false);
    const limit = theoryLimit(inertia, seat, part, move);
    expect((0.3 * torquePerMu) / inertia).toBeCloseTo(limit, 9);
  });
});
