import { z } from 'zod';
import { idSchema, instantSchema } from './common.ts';
import { intervalSchema } from './analysis.ts';
import { verdicts } from './verdict.ts';

/** One row a fixture of the manager's table. */
export const overviewRowSchema = z.object({
  fixtureId: idSchema,
  code: z.string(),
  name: z.string(),
  line: z.string(),
  verdict: z.enum(verdicts),
  sentence: z.string(),
  tightest: z
    .object({ label: z.string(), limit: z.number() })
    .nullable()
    .describe('configuration with the lowest working limit, rad/s²'),
  mu50: intervalSchema,
  benchMu: z.number().nullable().describe('mean kinetic coefficient, else static'),
  margin: z
    .enum(['breached', 'not shown', 'not checked', 'shown'])
    .describe('worst of the configurations'),
  partsPerHour: z
    .object({ theory: z.number(), limit: z.number().nullable() })
    .nullable()
    .describe('at the tightest configuration: at the theory limit, and at the working limit'),
  trials: z.number().int(),
  lastTrialAt: instantSchema.nullable(),
});

/** One mark of the parity picture, rad/s². */
export const parityPointSchema = z.object({
  fixtureId: idSchema,
  code: z.string(),
  label: z.string(),
  theory: z.number(),
  fitted: intervalSchema,
  verdict: z.enum(verdicts),
});

export const overviewSchema = z
  .object({
    sentence: z.string(),
    rows: z.array(overviewRowSchema),
    parity: z.array(parityPointSchema),
  })
  .meta({ id: 'Overview' });

export type Overview = z.infer<typeof overviewSchema>;
export type OverviewRow = z.infer<typeof overviewRowSchema>;
export type ParityPoint = z.infer<typeof parityPointSchema>;
