import { benchPc, clipboard, driveRecorder, semicolonSheet } from '../dialects.ts';
import type { FixturePlan } from '../fixturePlan.ts';
import {
  closeSeries,
  demoRemark,
  fixed,
  friction,
  fullSeries,
  positions,
  slidingPair,
  verticalAxis,
  weightOnly,
} from './parts.ts';

const line = 'Line 4 assembly';

/** One position lets go earlier than its neighbours, though still where theory allows. */
export const spoolTurner: FixturePlan = {
  seed: 4101,
  fixture: {
    code: 'SP-7',
    name: 'Turner for spool valves',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 180, dwell: 1 },
    drive: { maxSpeed: null, maxAcceleration: 140, maxJerk: null, resolution: 0.1 },
    seat: {
      faces: [
        {
          name: 'cup',
          geometry: {
            kind: 'annulus',
            outerRadiusMm: 48,
            innerRadiusMm: 36,
            pressureLaw: 'uniform wear',
          },
          pressedBy: ['weight'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.015,
    },
    hold: weightOnly,
  },
  buildUp: {
    bodies: [
      fixed(
        'spool valve',
        { kind: 'solid cylinder, transverse', radiusMm: 22, lengthMm: 140 },
        1.8,
      ),
      slidingPair('trim mass', 12, 0.3),
    ],
    slide: { minMm: 20, maxMm: 110 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(30, 55, 80, 105),
  surfaces: 'urethane cup on hardened steel, dry',
  friction: friction(0.31, { testedOn: '2026-10-26', ratio: 1.36 }),
  truth: { mu: 0.39, steepness: 38, effects: { '55 mm': 0.82 } },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [
    {
      day: '2026-10-28',
      levels: [0.78, 0.92, 1, 1.06, 1.14, 1.22, 1.3, 1.42],
      repeats: 3,
      dialect: semicolonSheet,
    },
  ],
};

/** The arm bends: the holding torque changes all along the slide. */
export const flangeTilter: FixturePlan = {
  seed: 4202,
  fixture: {
    code: 'FL-9',
    name: 'Flange tilter with long arm',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 90, dwell: 2.2 },
    drive: { maxSpeed: null, maxAcceleration: 90, maxJerk: null, resolution: 0.1 },
    seat: {
      faces: [
        {
          name: 'ring',
          geometry: { kind: 'ring', radiusMm: 60 },
          pressedBy: ['weight', 'clamp'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.02,
    },
    hold: { ...weightOnly, clampForce: 40 },
  },
  buildUp: {
    bodies: [
      fixed('flange', { kind: 'solid cylinder, axial', radiusMm: 80 }, 3.4),
      fixed('arm', { kind: 'rod, about its centre', lengthMm: 420 }, 0.8),
      slidingPair('tool', 20, 0.9),
    ],
    slide: { minMm: 50, maxMm: 200 },
    relativeUncertainty: 0.015,
    remark: null,
  },
  configurations: positions(60, 105, 150, 195),
  surfaces: 'cork rubber on machined steel, dry',
  friction: friction(0.26, { testedOn: '2026-11-02', ratio: 1.4 }),
  truth: {
    mu: 0.31,
    steepness: 36,
    effects: { '60 mm': 1.16, '105 mm': 1.04, '150 mm': 0.93, '195 mm': 0.83 },
  },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [
    {
      day: '2026-11-04',
      levels: [0.75, 0.9, 0.98, 1.06, 1.14, 1.24, 1.36, 1.48],
      repeats: 3,
      dialect: driveRecorder,
    },
  ],
};

/** Nobody has tested its friction yet, so theory gives no limit. */
export const nozzleCarrier: FixturePlan = {
  seed: 4303,
  fixture: {
    code: 'NK-10',
    name: 'Carrier for spray nozzles',
    line,
    status: 'on trial',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 60, dwell: 0.6 },
    drive: { maxSpeed: null, maxAcceleration: 700, maxJerk: null, resolution: 0.5 },
    seat: {
      faces: [
        {
          name: 'magnet pads',
          geometry: { kind: 'pads', radiusMm: 30, count: 3 },
          pressedBy: ['weight', 'spring'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.02,
    },
    hold: { ...weightOnly, springForce: 20 },
  },
  buildUp: {
    bodies: [
      fixed('nozzle', { kind: 'solid cylinder, axial', radiusMm: 25 }, 0.9),
      fixed('plate', { kind: 'block', widthMm: 120, depthMm: 30 }, 0.3),
      slidingPair('trim mass', 8, 0.12),
    ],
    slide: { minMm: 15, maxMm: 60 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(20, 38, 56),
  surfaces: 'rubber-coated pads on stainless steel, dry',
  friction: { kinetic: null, static: null },
  truth: { mu: 0.35, steepness: 30 },
  judgedBy: 'peak lag',
  trialsPerSeating: 6,
  days: [{ day: '2026-11-10', levels: fullSeries, repeats: 2, dialect: clipboard }],
};

/** Three incline readings that scatter widely: more friction tests, not more trials. */
export const bowlCarrier: FixturePlan = {
  seed: 4404,
  fixture: {
    code: 'BW-11',
    name: 'Carrier for strainer bowls',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 180, dwell: 1.6 },
    drive: { maxSpeed: null, maxAcceleration: 90, maxJerk: null, resolution: 0.1 },
    seat: {
      faces: [
        {
          name: 'ring',
          geometry: { kind: 'ring', radiusMm: 70 },
          pressedBy: ['weight'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.02,
    },
    hold: weightOnly,
  },
  buildUp: {
    bodies: [
      fixed('bowl', { kind: 'thin sphere', radiusMm: 85 }, 2.4),
      slidingPair('trim mass', 14, 0.4),
    ],
    slide: { minMm: 30, maxMm: 130 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(40, 80, 120),
  surfaces: 'natural rubber on pressed steel, dry',
  friction: friction(0.4, { testedOn: '2026-08-20', readings: 3, spread: 0.09 }),
  truth: { mu: 0.45, steepness: 33 },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [{ day: '2026-08-24', levels: fullSeries, repeats: 3, dialect: benchPc }],
};

/** A short first series in which held and slipped do not overlap anywhere. */
export const couplingNest: FixturePlan = {
  seed: 4505,
  fixture: {
    code: 'CN-12',
    name: 'Nest for hose couplings',
    line,
    status: 'on trial',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 90, dwell: 0.7 },
    drive: { maxSpeed: null, maxAcceleration: 600, maxJerk: null, resolution: 0.5 },
    seat: {
      faces: [
        {
          name: 'ring',
          geometry: { kind: 'ring', radiusMm: 36 },
          pressedBy: ['weight', 'spring'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.015,
    },
    hold: { ...weightOnly, springForce: 12 },
  },
  buildUp: {
    bodies: [
      fixed(
        'coupling',
        { kind: 'hollow cylinder, axial', outerRadiusMm: 32, innerRadiusMm: 18 },
        1.1,
      ),
      slidingPair('trim mass', 9, 0.15),
    ],
    slide: { minMm: 15, maxMm: 70 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(20, 40, 60),
  surfaces: 'nitrile ring on brass, dry',
  friction: friction(0.28, { testedOn: '2026-11-17', ratio: 1.25 }),
  truth: { mu: 0.31, steepness: 60 },
  judgedBy: 'peak lag',
  trialsPerSeating: 4,
  days: [{ day: '2026-11-18', levels: [0.7, 0.85, 0.98, 1.24, 1.4], repeats: 1, dialect: benchPc }],
};

/** A plain fixture that does what theory says; one inertia was measured. */
export const coverTurner: FixturePlan = {
  seed: 4606,
  fixture: {
    code: 'CT-6',
    name: 'Turner for bonnet covers',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 180, dwell: 1.7 },
    drive: { maxSpeed: 9, maxAcceleration: 100, maxJerk: null, resolution: 0.1 },
    seat: {
      faces: [
        {
          name: 'ring',
          geometry: { kind: 'ring', radiusMm: 66 },
          pressedBy: ['weight'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.015,
    },
    hold: weightOnly,
  },
  buildUp: {
    bodies: [
      fixed('bonnet cover', { kind: 'solid cylinder, axial', radiusMm: 82 }, 2.9),
      slidingPair('trim mass', 15, 0.5),
    ],
    slide: { minMm: 25, maxMm: 130 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(35, 65, 95, 125),
  surfaces: 'nitrile ring on epoxy paint, dry',
  friction: friction(0.34, { testedOn: '2026-09-08' }),
  truth: { mu: 0.37, steepness: 35 },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [
    { day: '2026-09-10', levels: fullSeries, repeats: 2, dialect: semicolonSheet },
    { day: '2026-11-11', levels: closeSeries, repeats: 1, dialect: semicolonSheet },
  ],
};
