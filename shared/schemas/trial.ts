import { z } from 'zod';
import {
  idSchema,
  idParamSchema,
  instantSchema,
  pageOf,
  pageQuery,
  reasonSchema,
  versionSchema,
} from './common.ts';

export const outcomes = ['held', 'slipped', 'lost'] as const;
export const judgements = ['peak lag', 'end mark', 'by eye'] as const;

export const trialSchema = z
  .object({
    id: idSchema,
    fixtureId: idSchema,
    logId: idSchema,
    version: versionSchema,
    row: z
      .number()
      .int()
      .describe('line of the log, the header being line 1 unless lines precede it'),
    configurationId: idSchema,
    configuration: z.string().describe('label'),
    positionMm: z.number(),
    acceleration: z.number().describe('rad/s²'),
    outcome: z.enum(outcomes),
    judgedBy: z.enum(judgements).nullable(),
    slipAngle: z.number().nullable().describe('rad'),
    order: z.number().nullable(),
    at: instantSchema.nullable(),
    direction: z.string().nullable(),
    part: z.string().nullable(),
    seating: z.string().nullable(),
    series: z.string().nullable(),
    batch: z.string().nullable(),
    temperature: z.number().nullable().describe('°C'),
    remark: z.string().nullable(),
    excluded: z.boolean(),
    excludedReason: z.string().nullable(),
    excludedBy: z.string().nullable(),
    excludedAt: instantSchema.nullable(),
  })
  .meta({ id: 'Trial' });

export const trialPatchSchema = z
  .strictObject({ version: versionSchema, excluded: z.boolean(), reason: reasonSchema })
  .meta({ id: 'TrialPatch' });

export const trialSorts = [
  'id',
  '-id',
  'acceleration',
  '-acceleration',
  'configuration',
  '-configuration',
  'order',
  '-order',
  'outcome',
  '-outcome',
] as const;

export const trialQuerySchema = z.strictObject({
  configuration: z.string().max(40).optional(),
  outcome: z.enum(outcomes).optional(),
  excluded: z.enum(['true', 'false']).optional(),
  log: idParamSchema.optional(),
  sort: z.enum(trialSorts).default('id'),
  ...pageQuery,
});

export const trialPageSchema = pageOf(trialSchema).meta({ id: 'TrialPage' });

export type Outcome = (typeof outcomes)[number];
export type Judgement = (typeof judgements)[number];
export type Trial = z.infer<typeof trialSchema>;
export type TrialPatch = z.infer<typeof trialPatchSchema>;
export type TrialQuery = z.infer<typeof trialQuerySchema>;
