import { benchPc, semicolonSheet, driveRecorder } from '../dialects.ts';
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

const line = 'Line 2 pump housings';

/** Clamped from above, pads on both sides: in line. */
export const housingIndexer: FixturePlan = {
  seed: 2101,
  fixture: {
    code: 'PX-1',
    name: 'Indexer for volute housings',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 120, dwell: 2.4 },
    drive: { maxSpeed: 10, maxAcceleration: 160, maxJerk: 4000, resolution: 0.2 },
    seat: {
      faces: [
        {
          name: 'lower pads',
          geometry: { kind: 'pads', radiusMm: 70, count: 4 },
          pressedBy: ['weight', 'clamp'],
          torsionallyFixed: true,
        },
        {
          name: 'clamp plate',
          geometry: { kind: 'disc', radiusMm: 40, pressureLaw: 'uniform pressure' },
          pressedBy: ['clamp'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.02,
    },
    hold: { ...weightOnly, clampForce: 180 },
  },
  buildUp: {
    bodies: [
      fixed(
        'volute housing',
        { kind: 'hollow cylinder, axial', outerRadiusMm: 95, innerRadiusMm: 60 },
        6.4,
      ),
      fixed('adapter', { kind: 'block', widthMm: 220, depthMm: 60 }, 1.1),
      slidingPair('balance mass', 20, 1.2),
    ],
    slide: { minMm: 40, maxMm: 160 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(50, 85, 120, 155),
  surfaces: 'polyurethane on primed casting, dry',
  friction: friction(0.244, { testedOn: '2026-08-11' }),
  truth: { mu: 0.265, steepness: 33 },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [
    { day: '2026-08-18', levels: fullSeries, repeats: 2, dialect: semicolonSheet },
    { day: '2026-08-19', levels: closeSeries, repeats: 1, dialect: semicolonSheet },
  ],
};

/** Oil on the pads of one position: it slips even below the limit of theory with margin. */
export const elbowTurner: FixturePlan = {
  seed: 2202,
  fixture: {
    code: 'EL-8',
    name: 'Turner for suction elbows',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 180, dwell: 1.8 },
    drive: { maxSpeed: null, maxAcceleration: 90, maxJerk: null, resolution: 0.1 },
    seat: {
      faces: [
        {
          name: 'seat ring',
          geometry: { kind: 'ring', radiusMm: 64 },
          pressedBy: ['weight', 'spring'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.02,
    },
    hold: { ...weightOnly, springForce: 45 },
  },
  buildUp: {
    bodies: [
      fixed(
        'elbow',
        {
          kind: 'hollow cylinder, transverse',
          outerRadiusMm: 45,
          innerRadiusMm: 38,
          lengthMm: 210,
        },
        4.2,
      ),
      slidingPair('trim mass', 18, 0.9),
    ],
    slide: { minMm: 30, maxMm: 150 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(40, 75, 110, 145),
  surfaces: 'nitrile ring on cast iron, dry',
  friction: friction(0.29, { testedOn: '2026-09-21' }),
  truth: { mu: 0.315, steepness: 35, effects: { '110 mm': 0.62 } },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [{ day: '2026-09-23', levels: [0.6, ...fullSeries], repeats: 2, dialect: benchPc }],
};

/** Off-centre housing half: theory follows the limit surface, and the trials agree. */
export const housingFlipper: FixturePlan = {
  seed: 2303,
  fixture: {
    code: 'HF-5',
    name: 'Flipper for split housing halves',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 180, dwell: 2 },
    drive: { maxSpeed: null, maxAcceleration: 240, maxJerk: null, resolution: 0.2 },
    seat: {
      faces: [
        {
          name: 'pads',
          geometry: { kind: 'pads', radiusMm: 80, count: 6 },
          pressedBy: ['weight', 'clamp'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.02,
    },
    hold: { ...weightOnly, clampForce: 120, eccentricityMm: 9 },
  },
  buildUp: {
    bodies: [
      fixed('housing half', { kind: 'block', widthMm: 190, depthMm: 120 }, 5.2, 14),
      fixed('clamp frame', { kind: 'block', widthMm: 240, depthMm: 30 }, 1.3),
      slidingPair('balance mass', 18, 0.8),
    ],
    slide: { minMm: 40, maxMm: 150 },
    relativeUncertainty: 0.012,
    remark: null,
  },
  configurations: positions(50, 80, 110, 140),
  surfaces: 'polyurethane on milled aluminium, dry',
  friction: friction(0.33, { testedOn: '2026-10-05', by: 'angle' }),
  truth: { mu: 0.36, steepness: 32 },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [
    { day: '2026-10-07', levels: fullSeries, repeats: 2, dialect: driveRecorder },
    { day: '2026-10-08', levels: closeSeries, repeats: 1, dialect: driveRecorder },
  ],
};

/** A leaning table: the weight presses less and pulls sideways; in line all the same. */
export const leaningTable: FixturePlan = {
  seed: 2404,
  fixture: {
    code: 'LT-3',
    name: 'Leaning table for discharge covers',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: { tiltDeg: 25 },
    move: { angleDeg: 90, dwell: 1.3 },
    drive: { maxSpeed: null, maxAcceleration: 340, maxJerk: null, resolution: 0.2 },
    seat: {
      faces: [
        {
          name: 'pads',
          geometry: { kind: 'pads', radiusMm: 72, count: 4 },
          pressedBy: ['weight', 'clamp'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.02,
    },
    hold: { ...weightOnly, clampForce: 150 },
  },
  buildUp: {
    bodies: [
      fixed('cover', { kind: 'solid cylinder, axial', radiusMm: 88 }, 3.2),
      fixed('frame', { kind: 'block', widthMm: 200, depthMm: 40 }, 0.9),
      slidingPair('balance mass', 16, 0.6),
    ],
    slide: { minMm: 40, maxMm: 140 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(45, 75, 105, 135),
  surfaces: 'polyurethane on painted steel, dry',
  friction: friction(0.31, { testedOn: '2026-10-15', by: 'angle' }),
  truth: { mu: 0.34, steepness: 34 },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [
    { day: '2026-10-21', levels: fullSeries, repeats: 2, dialect: benchPc },
    { day: '2026-10-22', levels: closeSeries, repeats: 1, dialect: benchPc },
  ],
};
