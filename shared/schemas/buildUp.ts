import { z } from 'zod';
import {
  idSchema,
  instantSchema,
  lineSchema,
  nonNegative,
  positive,
  remarkSchema,
  versionSchema,
} from './common.ts';

const mm = positive.max(10_000);

/** Shape and the axis it turns about (its own central axis, parallel to the fixture's). */
export const bodyShapeSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('point') }),
  z.strictObject({ kind: z.literal('hoop'), radiusMm: mm }),
  z.strictObject({ kind: z.literal('solid cylinder, axial'), radiusMm: mm }),
  z.strictObject({ kind: z.literal('solid cylinder, transverse'), radiusMm: mm, lengthMm: mm }),
  z.strictObject({
    kind: z.literal('hollow cylinder, axial'),
    outerRadiusMm: mm,
    innerRadiusMm: mm,
  }),
  z.strictObject({
    kind: z.literal('hollow cylinder, transverse'),
    outerRadiusMm: mm,
    innerRadiusMm: mm,
    lengthMm: mm,
  }),
  z.strictObject({ kind: z.literal('rod, about its centre'), lengthMm: mm }),
  z.strictObject({ kind: z.literal('rod, about its end'), lengthMm: mm }),
  z.strictObject({ kind: z.literal('block'), widthMm: mm, depthMm: mm }),
  z.strictObject({ kind: z.literal('solid sphere'), radiusMm: mm }),
  z.strictObject({ kind: z.literal('thin sphere'), radiusMm: mm }),
  z.strictObject({ kind: z.literal('cone, axial'), radiusMm: mm }),
]);

/**
 * A body that turns with the part. `fixed` sits `offsetMm` from the fixture's axis; `slide` rides
 * on the slide, its centre at position + offset.
 */
export const bodySchema = z
  .strictObject({
    name: lineSchema(60),
    shape: bodyShapeSchema,
    mass: positive.max(1e5).describe('kg, each'),
    count: z.number().int().min(1).max(1000),
    placement: z.enum(['fixed', 'slide']),
    offsetMm: z.number().min(-10_000).max(10_000),
  })
  .superRefine((body, context) => {
    const { shape } = body;
    if ('innerRadiusMm' in shape && shape.innerRadiusMm >= shape.outerRadiusMm) {
      context.addIssue({
        code: 'custom',
        path: ['shape', 'innerRadiusMm'],
        message: 'must be below the outer radius',
      });
    }
  });

export const buildUpInputSchema = z
  .strictObject({
    version: versionSchema.describe("the fixture's version this change was made on"),
    bodies: z.array(bodySchema).min(1, 'a build-up has at least one body').max(60),
    slide: z
      .strictObject({
        minMm: z.number().min(-10_000).max(10_000),
        maxMm: z.number().min(-10_000).max(10_000),
      })
      .refine((s) => s.minMm < s.maxMm, { path: ['maxMm'], message: 'must be above minMm' })
      .describe('range of the slide, mm'),
    relativeUncertainty: nonNegative
      .max(0.5)
      .describe('standard relative uncertainty of the computed inertia'),
    remark: remarkSchema.nullable(),
  })
  .meta({ id: 'BuildUpInput' });

/** I(x) = Σ coefficients[k]·x^k with x in m and I in kg·m². */
export const inertiaPolynomialSchema = z.array(z.number()).length(3);

export const buildUpSchema = z
  .object({
    fixtureId: idSchema,
    fixtureVersion: versionSchema,
    revision: z.number().int().min(1),
    current: z.boolean(),
    bodies: z.array(bodySchema),
    slide: z.object({ minMm: z.number(), maxMm: z.number() }),
    relativeUncertainty: z.number(),
    remark: z.string().nullable(),
    totalMass: z.number().describe('kg'),
    polynomial: inertiaPolynomialSchema,
    createdAt: instantSchema,
    createdBy: z.string(),
  })
  .meta({ id: 'BuildUp' });

export const buildUpQuerySchema = z.strictObject({
  revision: z
    .string()
    .regex(/^[1-9][0-9]{0,6}$/, 'must be a whole number from 1')
    .transform(Number)
    .optional(),
});

export type BodyShape = z.infer<typeof bodyShapeSchema>;
export type Body = z.infer<typeof bodySchema>;
export type BuildUpInput = z.infer<typeof buildUpInputSchema>;
export type BuildUp = z.infer<typeof buildUpSchema>;
