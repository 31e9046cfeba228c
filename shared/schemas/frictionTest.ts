import { z } from 'zod';
import {
  idSchema,
  instantSchema,
  lineSchema,
  nonNegative,
  positive,
  reasonSchema,
  remarkSchema,
  versionSchema,
} from './common.ts';

export const frictionKinds = ['kinetic', 'static'] as const;

/** An incline reading: height over base, or the angle. */
export const inclineReadingSchema = z.union([
  z.strictObject({ heightMm: positive.max(10_000), baseMm: positive.max(10_000) }),
  z.strictObject({ angleDeg: positive.max(89) }),
]);

export const frictionTestInputSchema = z
  .strictObject({
    kind: z.enum(frictionKinds).describe('kinetic: keeps holding after a tap; static: breaks away'),
    face: lineSchema(60).nullable().describe('name of the face tested; null = every face'),
    surfaces: lineSchema(120),
    batch: lineSchema(60).nullable().describe('pad batch'),
    testedOn: z.iso.date(),
    readings: z.array(inclineReadingSchema).min(1, 'give at least one reading').max(200),
    readingUncertainty: nonNegative
      .max(0.5)
      .describe('standard uncertainty of μ common to all readings (gauge), absolute'),
    remark: remarkSchema.nullable(),
  })
  .meta({ id: 'FrictionTestInput' });

export const frictionTestPatchSchema = z
  .strictObject({ version: versionSchema, excluded: z.boolean(), reason: reasonSchema })
  .meta({ id: 'FrictionTestPatch' });

export const frictionTestSchema = z
  .object({
    id: idSchema,
    fixtureId: idSchema,
    version: versionSchema,
    ...frictionTestInputSchema.shape,
    mu: z.array(z.number()).describe('coefficient of friction of each reading'),
    mean: z.number(),
    sd: z.number().nullable().describe('null with one reading'),
    n: z.number().int(),
    excluded: z.boolean(),
    excludedReason: z.string().nullable(),
    createdAt: instantSchema,
    createdBy: z.string(),
  })
  .meta({ id: 'FrictionTest' });

/** What the tests of one kind say together. */
export const frictionSummarySchema = z.object({
  mean: z
    .number()
    .describe('of the seat: faces with tests of their own weighted by normal force × radius'),
  sd: z.number().nullable().describe('of the readings taken together; null with one reading'),
  n: z.number().int().describe('readings'),
  uncertainty: z
    .number()
    .nullable()
    .describe('standard uncertainty of the mean, gauge included; null with one reading'),
});

export const frictionTestsSchema = z
  .object({
    items: z.array(frictionTestSchema),
    kinetic: frictionSummarySchema.nullable(),
    static: frictionSummarySchema.nullable(),
  })
  .meta({ id: 'FrictionTests' });

export type FrictionKind = (typeof frictionKinds)[number];
export type InclineReading = z.infer<typeof inclineReadingSchema>;
export type FrictionTestInput = z.infer<typeof frictionTestInputSchema>;
export type FrictionTestPatch = z.infer<typeof frictionTestPatchSchema>;
export type FrictionTest = z.infer<typeof frictionTestSchema>;
export type FrictionSummary = z.infer<typeof frictionSummarySchema>;
export type FrictionTests = z.infer<typeof frictionTestsSchema>;
