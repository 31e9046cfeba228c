import { z } from 'zod';
import { idSchema, instantSchema, lineSchema } from './common.ts';
import { judgements, outcomes } from './trial.ts';

/** What a column of a log can mean. */
export const logFields = [
  'configuration',
  'position',
  'acceleration',
  'outcome',
  'slipAngle',
  'order',
  'time',
  'direction',
  'part',
  'seating',
  'series',
  'batch',
  'temperature',
  'judgedBy',
  'remark',
] as const;

export const lengthUnits = ['mm', 'cm', 'm', 'in'] as const;
export const accelerationUnits = ['rad/s²', 'deg/s²', 'rev/s²', 'rpm/s'] as const;
export const angleUnits = ['rad', '°'] as const;

/**
 * How a log is read. Everything is optional: what is left out is recognised from the file, and
 * the answer carries the whole mapping that was used.
 */
export const logMappingInputSchema = z
  .strictObject({
    delimiter: z.enum([',', ';', '\t']).optional(),
    decimal: z.enum(['.', ',']).optional(),
    columns: z
      .partialRecord(z.enum(logFields), z.string().max(200))
      .optional()
      .describe("each meaning's column header, as written in the file"),
    units: z
      .strictObject({
        position: z.enum(lengthUnits).optional(),
        acceleration: z.enum(accelerationUnits).optional(),
        slipAngle: z.enum(angleUnits).optional(),
      })
      .optional(),
    outcomes: z
      .record(z.string().max(60), z.enum(outcomes))
      .optional()
      .describe("the file's own words, lower case, and what they mean"),
    judgedBy: z
      .enum(judgements)
      .nullable()
      .optional()
      .describe('for rows without a value of their own'),
    addConfigurations: z
      .boolean()
      .optional()
      .describe('positions inside the slide that no configuration has yet become configurations'),
  })
  .meta({ id: 'LogMappingInput' });

export const logMappingSchema = z
  .object({
    encoding: z.enum(['utf-8', 'utf-16le', 'utf-16be', 'windows-1252']),
    delimiter: z.enum([',', ';', '\t']),
    decimal: z.enum(['.', ',']),
    headerLine: z.number().int().min(1),
    columns: z.partialRecord(z.enum(logFields), z.string()),
    units: z.object({
      position: z.enum(lengthUnits),
      acceleration: z.enum(accelerationUnits),
      slipAngle: z.enum(angleUnits),
    }),
    outcomes: z.record(z.string(), z.enum(outcomes)),
    judgedBy: z.enum(judgements).nullable(),
    addConfigurations: z.boolean(),
  })
  .meta({ id: 'LogMapping' });

/** Why a row was refused (or looks odd), and what to do about it. */
export const logProblemSchema = z.object({
  row: z.number().int().describe('line of the file, counted from 1; 0 = the whole file'),
  column: z.string().nullable(),
  value: z.string().nullable(),
  reason: z.string().describe('says what is wrong and how to mend it'),
});

export const logSummarySchema = z.object({
  id: idSchema.nullable().describe('null in a dry run'),
  sha256: z.string(),
  accepted: z.number().int(),
  refused: z.number().int(),
  duplicateOf: idSchema.optional(),
});

/** A row as it was understood, for the preview. */
export const logPreviewRowSchema = z.object({
  row: z.number().int(),
  configuration: z.string(),
  positionMm: z.number(),
  acceleration: z.number().describe('rad/s²'),
  outcome: z.enum(outcomes),
});

export const logAnswerSchema = z
  .object({
    log: logSummarySchema,
    problems: z.array(logProblemSchema).describe('refused rows'),
    oddities: z.array(logProblemSchema).describe('rows that are stored but look odd'),
    mapping: logMappingSchema,
    headers: z.array(z.string()),
    sample: z.array(z.array(z.string())).describe('first data rows as written'),
    preview: z.array(logPreviewRowSchema).max(2000),
    newConfigurations: z.array(z.object({ label: z.string(), positionMm: z.number() })),
    changes: z
      .array(z.string())
      .describe('sentences: what the stored trials changed; empty in a dry run'),
  })
  .meta({ id: 'LogAnswer' });

/** A stored log. */
export const trialLogSchema = z
  .object({
    id: idSchema,
    fixtureId: idSchema,
    fileName: z.string(),
    size: z.number().int().describe('bytes'),
    sha256: z.string(),
    accepted: z.number().int(),
    refused: z.number().int(),
    problems: z.array(logProblemSchema),
    mapping: logMappingSchema,
    createdAt: instantSchema,
    createdBy: z.string(),
  })
  .meta({ id: 'TrialLog' });

export const trialLogListSchema = z
  .object({ items: z.array(trialLogSchema.omit({ problems: true, mapping: true })) })
  .meta({ id: 'TrialLogList' });

/** The name of an uploaded file is a label, never a path. */
export const fileNameSchema = lineSchema(200);

export type LogField = (typeof logFields)[number];
export type LogMappingInput = z.infer<typeof logMappingInputSchema>;
export type LogMapping = z.infer<typeof logMappingSchema>;
export type LogProblem = z.infer<typeof logProblemSchema>;
export type LogAnswer = z.infer<typeof logAnswerSchema>;
export type TrialLog = z.infer<typeof trialLogSchema>;
export type TrialLogList = z.infer<typeof trialLogListSchema>;
