import { benchPc, clipboard, driveRecorder } from '../dialects.ts';
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

const line = 'Line 1 valve bodies';

/** One position that slips early, everything else as theory says. */
export const turnoverTable: FixturePlan = {
  seed: 1101,
  fixture: {
    code: 'TT-2',
    name: 'Turnover table for gate valve bodies',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 180, dwell: 1.5 },
    drive: { maxSpeed: null, maxAcceleration: 120, maxJerk: null, resolution: 0.1 },
    seat: {
      faces: [
        {
          name: 'rubber ring',
          geometry: { kind: 'ring', radiusMm: 52 },
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
        'valve body',
        { kind: 'hollow cylinder, axial', outerRadiusMm: 55, innerRadiusMm: 30 },
        1.9,
      ),
      fixed('cross bar', { kind: 'rod, about its centre', lengthMm: 280 }, 0.25),
      slidingPair('trim mass', 14, 0.4),
    ],
    slide: { minMm: 20, maxMm: 130 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(20, 45, 70, 95, 120),
  surfaces: 'nitrile ring on machined grey iron, dry',
  friction: friction(0.305, { testedOn: '2026-09-02' }),
  truth: { mu: 0.334, steepness: 36, effects: { '70 mm': 0.79 } },
  judgedBy: 'peak lag',
  trialsPerSeating: 6,
  days: [
    { day: '2026-09-14', levels: fullSeries, repeats: 2, batch: 'N-31', dialect: benchPc },
    {
      day: '2026-09-16',
      levels: [0.72, 0.78, 0.84, 0.9, 1],
      repeats: 2,
      only: ['70 mm'],
      batch: 'N-31',
      dialect: benchPc,
    },
  ],
};

/** Vacuum seat, healthy; at the outermost position nothing has slipped yet. */
export const vacuumNest: FixturePlan = {
  seed: 1203,
  fixture: {
    code: 'VN-4',
    name: 'Vacuum nest for ball valve halves',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 90, dwell: 0.9 },
    drive: { maxSpeed: 20, maxAcceleration: 600, maxJerk: 30000, resolution: 0.5 },
    seat: {
      faces: [
        {
          name: 'sealing lip',
          geometry: {
            kind: 'annulus',
            outerRadiusMm: 42,
            innerRadiusMm: 34,
            pressureLaw: 'uniform wear',
          },
          pressedBy: ['weight', 'vacuum'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.025,
    },
    hold: { ...weightOnly, vacuum: { pressureDifference: 42_000, sealedAreaMm2: 3600 } },
  },
  buildUp: {
    bodies: [
      fixed('valve half', { kind: 'solid cylinder, axial', radiusMm: 62 }, 3.1),
      fixed('carrier', { kind: 'block', widthMm: 160, depthMm: 40 }, 0.6),
      slidingPair('counterweight', 16, 0.7),
    ],
    slide: { minMm: 30, maxMm: 110 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(35, 60, 85, 105),
  surfaces: 'silicone lip on turned brass, dry',
  friction: friction(0.42, { testedOn: '2026-08-26', by: 'angle' }),
  truth: { mu: 0.46, steepness: 34 },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [
    {
      day: '2026-09-03',
      levels: fullSeries,
      repeats: 2,
      only: ['35 mm', '60 mm', '85 mm'],
      dialect: driveRecorder,
    },
    {
      day: '2026-09-04',
      levels: [0.5, 0.6, 0.7, 0.78],
      repeats: 2,
      only: ['105 mm'],
      dialect: driveRecorder,
    },
    {
      day: '2026-10-12',
      levels: closeSeries,
      repeats: 2,
      only: ['35 mm', '60 mm', '85 mm'],
      dialect: driveRecorder,
    },
  ],
};

/** Not shown yet: too few trials. The messy log of another day changes that. */
export const clackCarrier: FixturePlan = {
  seed: 1302,
  fixture: {
    code: 'CC-3',
    name: 'Carrier for check valve clacks',
    line,
    status: 'on trial',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 180, dwell: 1.1 },
    drive: { maxSpeed: null, maxAcceleration: 180, maxJerk: null, resolution: 0.1 },
    seat: {
      faces: [
        {
          name: 'three pads',
          geometry: { kind: 'pads', radiusMm: 46, count: 3 },
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
      fixed('clack', { kind: 'solid cylinder, axial', radiusMm: 48 }, 1.2),
      fixed('bar', { kind: 'rod, about its centre', lengthMm: 240 }, 0.2),
      slidingPair('trim mass', 12, 0.3),
    ],
    slide: { minMm: 20, maxMm: 110 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(25, 50, 75, 100),
  surfaces: 'polyurethane pads on stainless steel, dry',
  friction: friction(0.36, { testedOn: '2026-10-19' }),
  truth: { mu: 0.395, steepness: 36, effects: { '75 mm': 0.78 } },
  judgedBy: 'peak lag',
  days: [{ day: '2026-10-20', levels: [0.75, 0.95, 1.15, 1.3], repeats: 1, dialect: clipboard }],
};
