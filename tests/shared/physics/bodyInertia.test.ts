import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodyInertia } from '../../../shared/physics/bodyInertia.ts';
import type { BodyShape } from '../../../shared/schemas/buildUp.ts';
import { expectCheckValue } from '../../reference/checkValue.ts';

const mass = 2.5;
const radiusMm = 120;
const lengthMm = 200;
const radii = { outerRadiusMm: 120, innerRadiusMm: 80 };

describe('moment of inertia of a body', () => {
  it.each<[string, BodyShape]>([
    ['inertia.hoop.axial', { kind: 'hoop', radiusMm }],
    ['inertia.solid_cyl.axial', { kind: 'solid cylinder, axial', radiusMm }],
    ['inertia.solid_cyl.transverse', { kind: 'solid cylinder, transverse', radiusMm, lengthMm }],
    ['inertia.thick_tube.axial', { kind: 'hollow cylinder, axial', ...radii }],
    ['inertia.thick_tube.transverse', { kind: 'hollow cylinder, transverse', ...radii, lengthMm }],
    ['inertia.rod.centre', { kind: 'rod, about its centre', lengthMm }],
    ['inertia.rod.end', { kind: 'rod, about its end', lengthMm }],
    ['inertia.block_0.3x0.1', { kind: 'block', widthMm: 300, depthMm: 100 }],
    ['inertia.sphere', { kind: 'solid sphere', radiusMm }],
    ['inertia.shell_sphere', { kind: 'thin sphere', radiusMm }],
    ['inertia.cone.axial', { kind: 'cone, axial', radiusMm }],
  ])('agrees with the table of the handbook: %s', (id, shape) => {
    expectCheckValue(id, bodyInertia(shape, mass));
  });

  it('becomes the thin tube across its axis when the inner radius reaches the outer', () => {
    const shape: BodyShape = {
      kind: 'hollow cylinder, transverse',
      outerRadiusMm: 120,
      innerRadiusMm: 120,
      lengthMm,
    };
    expectCheckValue('inertia.thin_tube.transverse', bodyInertia(shape, mass));
  });

  it('gives a steel ring the inertia of its dimensions and density', () => {
    const steel = 7850;
    const ringMass = (steel * Math.PI * (0.3 ** 2 - 0.2 ** 2) * 0.02) / 4;
    expect(ringMass).toBeCloseTo(6.1653756, 7);
    const ring = bodyInertia(
      { kind: 'hollow cylinder, axial', outerRadiusMm: 150, innerRadiusMm: 100 },
      ringMass,
    );
    expectCheckValue('inertia.steel_ring_I', ring);
  });

  it('is none for a point on its own axis', () => {
    expect(bodyInertia({ kind: 'point' }, mass)).toBe(0);
  });

  it('lies between disc and hoop for every hollow cylinder', () => {
    const size = fc.double({ min: 1, max: 1000, noNaN: true });
    fc.assert(
      fc.property(size, fc.double({ min: 0, max: 1, noNaN: true }), (outerRadiusMm, share) => {
        const hollow = bodyInertia(
          { kind: 'hollow cylinder, axial', outerRadiusMm, innerRadiusMm: share * outerRadiusMm },
          mass,
        );
        const hoop = bodyInertia({ kind: 'hoop', radiusMm: outerRadiusMm }, mass);
        expect(hollow).toBeGreaterThanOrEqual(hoop / 2 - 1e-12);
        expect(hollow).toBeLessThanOrEqual(hoop * (1 + 1e-12));
      }),
    );
  });

  it('refuses a mass, a radius or an inner radius out of range by name', () => {
    expect(() => bodyInertia({ kind: 'hoop', radiusMm }, 0)).toThrow(/^mass must be/);
    expect(() => bodyInertia({ kind: 'hoop', radiusMm: -1 }, 1)).toThrow(/^radiusMm must be/);
    expect(() =>
      bodyInertia({ kind: 'hollow cylinder, axial', outerRadiusMm: 5, innerRadiusMm: 6 }, 1),
    ).toThrow(/innerRadiusMm must not exceed/);
  });
});
