import { z } from 'zod';
import { idSchema, lineSchema, nonNegative, positive, versionSchema } from './common.ts';

const measuredInertiaSchema = z
  .strictObject({
    value: positive.max(1e6).describe('kg·m²'),
    relativeUncertainty: nonNegative.max(0.5).describe('standard relative uncertainty'),
    method: lineSchema(200),
  })
  .describe('replaces the computed inertia');

const fields = {
  label: lineSchema(40),
  positionMm: z.number().min(-10_000).max(10_000),
  measuredInertia: measuredInertiaSchema.nullable(),
};

export const configurationInputSchema = z.strictObject(fields).meta({ id: 'ConfigurationInput' });

export const configurationPatchSchema = z
  .strictObject({ version: versionSchema, ...z.strictObject(fields).partial().shape })
  .meta({ id: 'ConfigurationPatch' });

export const configurationSchema = z
  .object({
    id: idSchema,
    fixtureId: idSchema,
    version: versionSchema,
    ...fields,
    computedInertia: z
      .number()
      .nullable()
      .describe('kg·m² from the current build-up; null without one'),
    inertia: z.number().nullable().describe('kg·m² in force: measured, else computed'),
    inertiaRelativeUncertainty: z.number(),
    trials: z.number().int(),
  })
  .meta({ id: 'Configuration' });

export type MeasuredInertia = z.infer<typeof measuredInertiaSchema>;
export type ConfigurationInput = z.infer<typeof configurationInputSchema>;
export type ConfigurationPatch = z.infer<typeof configurationPatchSchema>;
export type Configuration = z.infer<typeof configurationSchema>;
