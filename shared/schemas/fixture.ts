import { z } from 'zod';
import {
  idSchema,
  instantSchema,
  lineSchema,
  nonNegative,
  pageOf,
  pageQuery,
  positive,
  remarkSchema,
  versionSchema,
} from './common.ts';
import { verdicts } from './verdict.ts';

const pressureLaw = z
  .enum(['uniform pressure', 'uniform wear'])
  .describe('uniform pressure for new faces, uniform wear for worn-in ones');

/** Where a face touches; radii in mm. */
export const faceGeometrySchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('ring'), radiusMm: positive.max(10_000) }),
  z.strictObject({ kind: z.literal('disc'), radiusMm: positive.max(10_000), pressureLaw }),
  z
    .strictObject({
      kind: z.literal('annulus'),
      outerRadiusMm: positive.max(10_000),
      innerRadiusMm: positive.max(10_000),
      pressureLaw,
    })
    .refine((g) => g.innerRadiusMm < g.outerRadiusMm, {
      path: ['innerRadiusMm'],
      message: 'must be below the outer radius',
    }),
  z.strictObject({
    kind: z.literal('pads'),
    radiusMm: positive.max(10_000).describe('radius of the circle the pads stand on'),
    count: z.number().int().min(1).max(100),
  }),
]);

export const loads = ['weight', 'clamp', 'spring', 'vacuum'] as const;

/** One face that can slip. */
export const faceSchema = z.strictObject({
  name: lineSchema(60),
  geometry: faceGeometrySchema,
  pressedBy: z.array(z.enum(loads)).min(1, 'name at least one load that presses this face'),
  torsionallyFixed: z
    .boolean()
    .describe('false for a free-swivelling tip, which carries no torque and is left out'),
});

/** Shape of the fixture as entered; every change of seat, hold or move needs the version. */
const fixtureFields = {
  code: lineSchema(24).regex(
    /^[A-Za-z0-9][A-Za-z0-9._-]*$/,
    'letters, digits, dot, dash or underscore',
  ),
  name: lineSchema(120),
  line: lineSchema(60),
  status: z.enum(['in use', 'on trial', 'retired']),
  remark: remarkSchema.nullable(),
  axis: z.strictObject({
    tiltDeg: z
      .number()
      .min(0)
      .max(180)
      .describe('angle of the axis from the vertical; 0 = vertical, 180 = upside down'),
  }),
  move: z.strictObject({
    angleDeg: positive.max(36_000),
    dwell: nonNegative.max(3600).describe('s at rest between two moves'),
  }),
  drive: z.strictObject({
    maxSpeed: positive.max(10_000).nullable().describe('rad/s; null = never reached'),
    maxAcceleration: positive.max(1e6).describe('rad/s²'),
    maxJerk: positive.max(1e9).nullable().describe('rad/s³; null = not limited'),
    resolution: positive.max(1000).describe('rad/s²; limits are rounded down to it'),
  }),
  seat: z.strictObject({
    faces: z.array(faceSchema).min(1, 'a seat has at least one face').max(12),
    relativeUncertainty: nonNegative
      .max(0.5)
      .describe('standard relative uncertainty of the torque per unit of friction coefficient'),
  }),
  hold: z.strictObject({
    mass: positive
      .max(1e5)
      .nullable()
      .describe('kg whose weight presses the seat; null = the bodies of the build-up'),
    verticalAcceleration: z.number().min(-9).max(100).describe('m/s², up positive'),
    clampForce: nonNegative.max(1e7).describe('N'),
    springForce: nonNegative.max(1e7).describe('N'),
    vacuum: z
      .strictObject({
        pressureDifference: positive.max(101_325).describe('Pa'),
        sealedAreaMm2: positive.max(1e8),
      })
      .nullable(),
    eccentricityMm: nonNegative.max(10_000).describe('centre of mass from the axis'),
  }),
};

export const fixtureInputSchema = z.strictObject(fixtureFields).meta({ id: 'FixtureInput' });

export const fixturePatchSchema = z
  .strictObject({ version: versionSchema, ...z.strictObject(fixtureFields).partial().shape })
  .meta({ id: 'FixturePatch' });

export const fixtureSchema = z
  .object({
    id: idSchema,
    version: versionSchema,
    ...fixtureFields,
    createdAt: instantSchema,
    updatedAt: instantSchema,
  })
  .meta({ id: 'Fixture' });

/** A row of the fixtures list. */
export const fixtureRowSchema = z.object({
  id: idSchema,
  code: z.string(),
  name: z.string(),
  line: z.string(),
  status: fixtureFields.status,
  configurations: z.number().int(),
  trials: z.number().int().describe('trials that are not excluded'),
  verdict: z.enum(verdicts),
  sentence: z.string(),
  lastTrialAt: instantSchema.nullable(),
});

export const fixtureSorts = [
  'code',
  '-code',
  'name',
  '-name',
  'line',
  '-line',
  'verdict',
  '-verdict',
  'trials',
  '-trials',
] as const;

export const fixtureQuerySchema = z.strictObject({
  search: z.string().max(100).optional(),
  line: z.string().max(60).optional(),
  verdict: z.enum(verdicts).optional(),
  sort: z.enum(fixtureSorts).default('code'),
  ...pageQuery,
});

export const fixturePageSchema = pageOf(fixtureRowSchema)
  .extend({ lines: z.array(z.string()).describe('every line there is, for the filter') })
  .meta({ id: 'FixturePage' });

export type FaceGeometry = z.infer<typeof faceGeometrySchema>;
export type Face = z.infer<typeof faceSchema>;
export type Load = (typeof loads)[number];
export type FixtureInput = z.infer<typeof fixtureInputSchema>;
export type FixturePatch = z.infer<typeof fixturePatchSchema>;
export type Fixture = z.infer<typeof fixtureSchema>;
export type FixtureRow = z.infer<typeof fixtureRowSchema>;
export type FixtureQuery = z.infer<typeof fixtureQuerySchema>;
