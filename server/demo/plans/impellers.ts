import { benchPc, clipboard, semicolonSheet } from '../dialects.ts';
import type { FixturePlan } from '../fixturePlan.ts';
import {
  demoRemark,
  fixed,
  friction,
  fullSeries,
  positions,
  slidingPair,
  verticalAxis,
  weightOnly,
} from './parts.ts';

const line = 'Line 3 impellers';

/** Pads glaze: the grip falls from trial to trial and from batch to batch. */
export const impellerSpinner: FixturePlan = {
  seed: 3101,
  fixture: {
    code: 'IM-4',
    name: 'Spin table for closed impellers',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 360, dwell: 0.8 },
    drive: { maxSpeed: 25, maxAcceleration: 220, maxJerk: null, resolution: 0.2 },
    seat: {
      faces: [
        {
          name: 'cork disc',
          geometry: { kind: 'disc', radiusMm: 60, pressureLaw: 'uniform wear' },
          pressedBy: ['weight', 'clamp'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.02,
    },
    hold: { ...weightOnly, clampForce: 60 },
  },
  buildUp: {
    bodies: [
      fixed('impeller', { kind: 'solid cylinder, axial', radiusMm: 78 }, 2.6),
      slidingPair('trim mass', 12, 0.35),
    ],
    slide: { minMm: 20, maxMm: 100 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(25, 50, 75, 95),
  surfaces: 'cork pads on bronze, dry',
  friction: friction(0.38, { testedOn: '2026-08-03' }),
  truth: { mu: 0.455, steepness: 34, drift: 0.76 },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [
    { day: '2026-08-05', levels: fullSeries, repeats: 1, batch: 'K-07', dialect: benchPc },
    { day: '2026-09-09', levels: fullSeries, repeats: 1, batch: 'K-07', dialect: benchPc },
    { day: '2026-10-14', levels: fullSeries, repeats: 1, batch: 'K-08', dialect: benchPc },
  ],
};

/** New pads grip better than the incline said: holds longer. */
export const hubClamp: FixturePlan = {
  seed: 3202,
  fixture: {
    code: 'HC-6',
    name: 'Hub clamp for semi-open impellers',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 90, dwell: 1.2 },
    drive: { maxSpeed: null, maxAcceleration: 900, maxJerk: null, resolution: 0.5 },
    seat: {
      faces: [
        {
          name: 'hub face',
          geometry: {
            kind: 'annulus',
            outerRadiusMm: 34,
            innerRadiusMm: 18,
            pressureLaw: 'uniform pressure',
          },
          pressedBy: ['weight', 'clamp'],
          torsionallyFixed: true,
        },
      ],
      relativeUncertainty: 0.02,
    },
    hold: { ...weightOnly, clampForce: 260 },
  },
  buildUp: {
    bodies: [
      fixed('impeller', { kind: 'cone, axial', radiusMm: 85 }, 2.1),
      slidingPair('trim mass', 12, 0.3),
    ],
    slide: { minMm: 20, maxMm: 95 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(25, 55, 85),
  surfaces: 'sintered lining on bronze, dry',
  friction: friction(0.3, { testedOn: '2026-07-22', ratio: 1.12 }),
  truth: { mu: 0.43, steepness: 32 },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [
    {
      day: '2026-07-29',
      levels: [0.8, 1, 1.15, 1.27, 1.36, 1.45, 1.55, 1.7],
      repeats: 3,
      dialect: semicolonSheet,
    },
  ],
};

/** One position grips better than the others: late, still inside the band of theory. */
export const wheelCarrier: FixturePlan = {
  seed: 3303,
  fixture: {
    code: 'WC-9',
    name: 'Carrier for vortex wheels',
    line,
    status: 'in use',
    remark: demoRemark,
    axis: verticalAxis,
    move: { angleDeg: 180, dwell: 1.4 },
    drive: { maxSpeed: null, maxAcceleration: 130, maxJerk: null, resolution: 0.1 },
    seat: {
      faces: [
        {
          name: 'ring',
          geometry: { kind: 'ring', radiusMm: 58 },
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
      fixed('vortex wheel', { kind: 'solid cylinder, axial', radiusMm: 66 }, 2.2),
      fixed('arm', { kind: 'rod, about its centre', lengthMm: 260 }, 0.3),
      slidingPair('trim mass', 14, 0.45),
    ],
    slide: { minMm: 25, maxMm: 125 },
    relativeUncertainty: 0.01,
    remark: null,
  },
  configurations: positions(30, 60, 90, 120),
  surfaces: 'nitrile ring on duplex steel, dry',
  friction: friction(0.27, { testedOn: '2026-09-28', ratio: 1.35 }),
  truth: { mu: 0.285, steepness: 38, effects: { '90 mm': 1.22 } },
  judgedBy: 'peak lag',
  trialsPerSeating: 8,
  days: [
    {
      day: '2026-09-30',
      levels: [0.75, 0.88, 0.96, 1.02, 1.08, 1.15, 1.24, 1.35],
      repeats: 3,
      dialect: clipboard,
    },
  ],
};
