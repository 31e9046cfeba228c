import { describe, expect, it } from 'vitest';
import {
  fixtureTheory,
  type TheoryBuildUp,
  type TheoryFixture,
} from '../../../shared/physics/fixtureTheory.ts';
import { frictionStatistics, inclineMu } from '../../../shared/physics/frictionTest.ts';
import type { FaceTest } from '../../../shared/physics/seatFriction.ts';
import { theoryLimit } from '../../../shared/physics/theoryLimit.ts';

const fixture: TheoryFixture = {
  axis: { tiltDeg: 0 },
  move: { angleDeg: 180, dwell: 1.5 },
  drive: { maxSpeed: null, maxAcceleration: 90, maxJerk: null, resolution: 0.1 },
  seat: {
    faces: [
      {
        name: 'seat',
        geometry: { kind: 'ring', radiusMm: 26 },
        pressedBy: ['weight'],
        torsionallyFixed: true,
      },
    ],
    relativeUncertainty: 0.02,
  },
  hold: {
    mass: 0.1625,
    verticalAcceleration: 0,
    clampForce: 0,
    springForce: 0,
    vacuum: null,
    eccentricityMm: 0,
  },
};

const buildUp: TheoryBuildUp = {
  bodies: [
    {
      name: 'carrier',
      shape: { kind: 'solid cylinder, axial', radiusMm: 40 },
      mass: 0.5,
      count: 1,
      placement: 'fixed',
      offsetMm: 0,
    },
    {
      name: 'mass',
      shape: { kind: 'point' },
      mass: 0.1,
      count: 2,
      placement: 'slide',
      offsetMm: 0,
    },
  ],
  relativeUncertainty: 0.01,
};

const positions = [
  { label: '20 mm', positionMm: 20, measuredInertia: null },
  {
    label: '70 mm',
    positionMm: 70,
    measuredInertia: { value: 1.5e-3, relativeUncertainty: 0.005, method: 'bifilar pendulum' },
  },
];

const readings = [11.8, 12.1, 11.6, 12.4].map((angleDeg) => ({ angleDeg }));
const tested: FaceTest[] = [{ kind: 'kinetic', face: null, readings, readingUncertainty: 0 }];

describe('theory of a fixture', () => {
  it('gives inertia, torque per μ, friction, move and drive of a plain seat', () => {
    const theory = fixtureTheory(fixture, buildUp, positions, tested);
    expect(theory.torquePerMu).toBeCloseTo(0.1625 * 9.80665 * 0.026, 12);
    expect(theory.configurations.map(({ torquePerMu }) => torquePerMu)).toEqual(
      Array(2).fill({ value: theory.torquePerMu, relativeUncertainty: 0.02 }),
    );
    expect(theory.configurations[0]?.inertia).toBeCloseTo(4e-4 + 0.2 * 0.02 ** 2, 12);
    expect(theory.configurations[0]?.inertiaRelativeUncertainty).toBe(0.01);
    const { mean, n } = frictionStatistics(readings.map(inclineMu));
    expect(theory.friction.kinetic?.mean).toBeCloseTo(mean, 12);
    expect(theory.friction.kinetic?.n).toBe(n);
    expect(theory.friction.static).toBeUndefined();
    expect(theory.moveAngle).toBe(Math.PI);
    expect(theory.drive).toEqual({ maxAcceleration: 90, resolution: 0.1 });
    expect(theory.totalMass).toBe(0.7);
    expect(theory.notes).toEqual([]);
  });

  it('prefers a measured inertia and keeps the computed one beside it', () => {
    const [, second] = fixtureTheory(fixture, buildUp, positions, tested).configurations;
    expect(second?.inertia).toBe(1.5e-3);
    expect(second?.inertiaRelativeUncertainty).toBe(0.005);
    expect(second?.computedInertia).toBeCloseTo(4e-4 + 0.2 * 0.07 ** 2, 12);
  });

  it('takes the weight of the build-up when no held mass is given', () => {
    const hold = { ...fixture.hold, mass: null };
    const theory = fixtureTheory({ ...fixture, hold }, buildUp, positions, tested);
    expect(theory.torquePerMu).toBeCloseTo(0.7 * 9.80665 * 0.026, 12);
  });

  it('leaves out a face that swivels freely', () => {
    const tip = {
      name: 'tip',
      geometry: { kind: 'disc' as const, radiusMm: 5, pressureLaw: 'uniform wear' as const },
      pressedBy: ['clamp' as const],
      torsionallyFixed: false,
    };
    const seat = { ...fixture.seat, faces: [...fixture.seat.faces, tip] };
    const theory = fixtureTheory({ ...fixture, seat }, buildUp, positions, tested);
    expect(theory.torquePerMu).toBeCloseTo(0.1625 * 9.80665 * 0.026, 12);
    expect(theory.faces.map(({ name }) => name)).toEqual(['seat']);
  });

  it('gives every off-centre configuration its own torque, so that μ·T/I is the ellipse', () => {
    const hold = { ...fixture.hold, eccentricityMm: 4 };
    const theory = fixtureTheory({ ...fixture, hold }, buildUp, positions, tested);
    const mu = theory.friction.kinetic?.mean ?? Number.NaN;
    const force = mu * 0.1625 * 9.80665;
    for (const { inertia, torquePerMu } of theory.configurations) {
      const limit = theoryLimit(
        inertia ?? Number.NaN,
        { torque: force * 0.026, force },
        { mass: 0.7, eccentricity: 0.004 },
        { angle: Math.PI, maxSpeed: null },
      );
      expect((mu * (torquePerMu?.value ?? Number.NaN)) / (inertia ?? Number.NaN)).toBeCloseTo(
        limit,
        9,
      );
    }
    const [first, second] = theory.configurations;
    expect(first?.torquePerMu?.value).toBeLessThan(second?.torquePerMu?.value ?? 0);
  });

  it('combines faces with friction tests of their own by the torque they carry', () => {
    const faces = [
      { ...fixture.seat.faces[0], pressedBy: ['clamp' as const] },
      {
        name: 'pad',
        geometry: { kind: 'ring' as const, radiusMm: 13 },
        pressedBy: ['clamp' as const],
        torsionallyFixed: true,
      },
    ];
    const theory = fixtureTheory(
      {
        ...fixture,
        seat: { ...fixture.seat, faces },
        hold: { ...fixture.hold, clampForce: 100 },
      },
      buildUp,
      positions,
      [...tested, { ...tested[0], face: 'pad', readings: [{ angleDeg: 20 }, { angleDeg: 21 }] }],
    );
    const seatMean = frictionStatistics(readings.map(inclineMu)).mean;
    const padMean = (inclineMu({ angleDeg: 20 }) + inclineMu({ angleDeg: 21 })) / 2;
    expect(theory.friction.kinetic?.mean).toBeCloseTo((2 * seatMean + padMean) / 3, 12);
    expect(theory.torquePerMu).toBeCloseTo(100 * 0.039, 12);
  });

  it('says in a note what it cannot have, and gives null for it', () => {
    const bare = fixtureTheory(fixture, null, positions, []);
    expect(bare.configurations[0]?.inertia).toBeNull();
    expect(bare.configurations[1]?.inertia).toBe(1.5e-3);
    expect(bare.friction).toEqual({});
    expect(bare.notes.join(' ')).toMatch(/No build-up yet.*No friction test yet/);

    const hanging = fixtureTheory(
      { ...fixture, axis: { tiltDeg: 180 } },
      buildUp,
      positions,
      tested,
    );
    expect(hanging.torquePerMu).toBeNull();
    expect(hanging.notes.join(' ')).toMatch(/face “seat” is -1.59 N: it lifts off/);

    const leaning = fixtureTheory(
      { ...fixture, axis: { tiltDeg: 60 } },
      buildUp,
      positions,
      tested,
    );
    expect(leaning.configurations[0]?.torquePerMu).toBeNull();
    expect(leaning.notes.join(' ')).toMatch(/20 mm: by theory the part slides at rest/);
  });

  it('leaves excluded friction tests out and names tests of a face that is not there', () => {
    const theory = fixtureTheory(fixture, buildUp, positions, [
      ...tested,
      { ...tested[0], readings: [{ angleDeg: 40 }], excluded: true },
      { ...tested[0], face: 'upper pad' },
    ]);
    expect(theory.friction.kinetic?.n).toBe(4);
    expect(theory.notes).toEqual([
      'Friction tests of “upper pad” are not used: no face of that name carries torque.',
    ]);
  });
});
