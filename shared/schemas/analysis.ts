import { z } from 'zod';
import { idSchema, instantSchema, lineSchema, positive, remarkSchema } from './common.ts';
import { judgements, outcomes } from './trial.ts';
import { verdicts } from './verdict.ts';

export const estimators = ['firth', 'ml'] as const;
export const links = ['logit', 'probit', 'cloglog'] as const;
export const failures = ['slipped', 'lost'] as const;
export const rules = ['lower of both', 'theory', 'demonstrated'] as const;

const label = lineSchema(40);

export const analysisTrialSchema = z.strictObject({
  configuration: label,
  inertia: positive.max(1e9).describe('kg·m²; the same for all trials of a configuration'),
  acceleration: positive.max(1e12).describe('rad/s²'),
  outcome: z.enum(outcomes),
  order: z.number().optional().describe('run order'),
  batch: z.string().max(60).optional(),
  series: z.string().max(60).optional().describe('one seated part stepped up until it slips'),
  seating: z.string().max(60).optional(),
  part: z.string().max(60).optional(),
  slipAngle: z.number().nonnegative().optional().describe('rad'),
  judgedBy: z.enum(judgements).optional(),
});

const torquePerMuSchema = z.union([
  positive.max(1e12),
  z.strictObject({ value: positive.max(1e12), relativeUncertainty: z.number().min(0).max(1) }),
]);

const frictionSampleSchema = z.strictObject({
  mean: positive.max(10),
  sd: z.number().nonnegative().max(10),
  n: z.number().int().min(1),
});

/** What tunes an analysis without touching its trials. */
export const analysisOptionsSchema = z.strictObject({
  rule: z.enum(rules).default('lower of both'),
  workingLimits: z
    .record(label, positive.max(1e12))
    .optional()
    .describe('rad/s² per configuration: the limit the margin check judges'),
  margin: z
    .number()
    .min(0, 'must be from 0 to below 1')
    .lt(1, 'must be from 0 to below 1')
    .default(0.3),
  target: z
    .number()
    .min(1e-4, 'must be from 0.0001 to 0.5')
    .max(0.5, 'must be from 0.0001 to 0.5')
    .default(0.01),
  tolerance: z
    .number()
    .gt(0, 'must be above 0 and below 1')
    .lt(1, 'must be above 0 and below 1')
    .default(0.15),
  confidence: z
    .number()
    .gt(0.5, 'must be above 0.5 and at most 0.9999')
    .max(0.9999, 'must be above 0.5 and at most 0.9999')
    .default(0.95),
  estimator: z.enum(estimators).default('firth'),
  link: z.enum(links).default('logit'),
  failure: z.enum(failures).default('slipped'),
});

/** Body of `POST /api/analysis`: nothing is stored. */
export const analysisRequestSchema = z
  .strictObject({
    trials: z.array(analysisTrialSchema).min(1, 'send at least one trial').max(20_000),
    torquePerMu: z
      .union([torquePerMuSchema, z.record(label, torquePerMuSchema)])
      .optional()
      .describe('N·m per unit of friction coefficient, one for all or one per configuration'),
    inertiaRelativeUncertainty: z.record(label, z.number().min(0).max(1)).optional(),
    moveAngle: positive.max(1000).optional().describe('rad'),
    smallestVisibleSlip: positive.max(1000).optional().describe('rad'),
    drive: z
      .strictObject({
        maxAcceleration: positive.max(1e12),
        resolution: positive.max(1e12).optional(),
      })
      .optional()
      .describe('rad/s²'),
    friction: z
      .strictObject({
        kinetic: frictionSampleSchema.optional(),
        static: frictionSampleSchema.optional(),
      })
      .optional(),
    ...analysisOptionsSchema.shape,
  })
  .meta({ id: 'AnalysisRequest' });

const number = z.number();
const end = z.number().nullable();

/** An end that does not exist is null: not bounded by these trials. */
export const intervalSchema = z.object({ estimate: end, lower: end, upper: end });

export const modelStatuses = ['converged', 'separated', 'iterationLimit', 'singular'] as const;
export const separationKinds = ['none', 'quasi', 'complete'] as const;

export const modelFitSchema = z.object({
  status: z.enum(modelStatuses),
  coefficients: z.array(z.object({ name: z.string(), estimate: end, se: end })),
  covariance: z.array(z.array(end)),
  logLik: end,
  penalisedLogLik: end,
  aicc: end,
});

export const shapeStates = [
  'not applicable',
  'early',
  'late',
  'no common curve',
  'on curve',
  'undecided',
] as const;
export const levelStates = [
  'slips early',
  'holds longer',
  'in line',
  'undecided',
  'not checked',
] as const;
export const marginStates = ['breached', 'shown', 'not shown', 'not checked'] as const;
export const bindings = ['theory', 'demonstrated', 'drive'] as const;

export const configurationResultSchema = z.object({
  label: z.string(),
  inertia: number.describe('kg·m²'),
  trials: z.number().int(),
  slips: z.number().int(),
  highestHeld: end,
  lowestSlipped: end,
  alpha50: z.object({ scaled: intervalSchema, offsets: intervalSchema }),
  alphaTarget: intervalSchema.extend({ model: z.enum(['scaled', 'shifted', 'offsets']) }),
  theory: z
    .object({ holding: end, lettingGo: end, holdingUncertainty: end, lettingGoUncertainty: end })
    .describe('rad/s²; uncertainties are relative half-widths at the confidence'),
  demonstrated: end,
  workingLimit: end.describe('by the rule, capped by the drive and rounded down'),
  binds: z.enum(bindings).nullable(),
  shape: z.object({ ratio: end, lower: end, upper: end, p: end, state: z.enum(shapeStates) }),
  level: z.object({ state: z.enum(levelStates), reason: z.string() }),
  margin: z.object({
    state: z.enum(marginStates),
    judged: end.describe('the limit that was judged, rad/s²'),
    slipsAtOrBelow: z.number().int(),
    trialsAtOrBelow: z.number().int(),
    upperBound: end.describe('one-sided Clopper–Pearson bound of the slip probability'),
  }),
  verdict: z.enum(verdicts),
  sentence: z.string(),
});

export const analysisResultSchema = z
  .object({
    engine: z.string(),
    status: z.enum(modelStatuses),
    estimator: z.enum(estimators),
    link: z.enum(links),
    counts: z.object({
      trials: z.number().int(),
      held: z.number().int(),
      slipped: z.number().int(),
      lost: z.number().int(),
      levels: z.number().int(),
    }),
    separation: z.object({
      overall: z.enum(separationKinds),
      configurations: z.record(z.string(), z.enum(separationKinds)),
    }),
    models: z.object({
      scaled: modelFitSchema,
      power: modelFitSchema.extend({ exponent: intervalSchema }),
      offsets: modelFitSchema,
      separate: modelFitSchema,
    }),
    comparisons: z.array(
      z.object({
        simpler: z.string(),
        fuller: z.string(),
        statistic: end,
        df: z.number().int(),
        p: end,
      }),
    ),
    torque50: intervalSchema,
    commonTorque50: intervalSchema,
    mu50: intervalSchema,
    configurations: z.array(configurationResultSchema),
    verdict: z.enum(verdicts),
    sentence: z.string(),
    diagnostics: z.object({
      drift: z.object({ change: end, p: end }),
      heterogeneity: z.object({ ratio: end, p: end }),
    }),
    limitFunction: z.object({ torque: number, from: z.string() }).nullable(),
    notes: z.array(z.string()),
  })
  .meta({ id: 'AnalysisResult' });

/** Body of `POST /api/fixtures/:id/analyses`: options over the stored trials. */
export const storedAnalysisInputSchema = z
  .strictObject({ ...analysisOptionsSchema.shape, note: remarkSchema.nullable().default(null) })
  .meta({ id: 'StoredAnalysisInput' });

const provenance = {
  fixtureId: idSchema,
  digest: z
    .string()
    .describe('SHA-256 over the trials, the build-up, the friction tests and the options'),
  buildUpRevision: z.number().int().nullable(),
};

/** What the Boundary screen shows: the analysis of the trials as they are now. */
export const boundarySchema = z
  .object({
    ...provenance,
    result: analysisResultSchema.nullable().describe('null before the first trial'),
    reason: z.string().nullable().describe('why there is no result yet, and what to do'),
    options: analysisOptionsSchema,
    polynomial: z.array(z.number()).nullable().describe('I(x), x in m'),
    positions: z.array(
      z.object({ label: z.string(), positionMm: z.number(), inertia: z.number().nullable() }),
    ),
    excluded: z.number().int().describe('trials left out by hand'),
    torquePerMu: z.number().nullable(),
    lastSaved: z.object({ id: idSchema, createdAt: instantSchema, digest: z.string() }).nullable(),
  })
  .meta({ id: 'Boundary' });

/** An immutable result. */
export const storedAnalysisSchema = analysisResultSchema
  .extend({
    id: idSchema,
    ...provenance,
    options: analysisOptionsSchema,
    note: z.string().nullable(),
    createdAt: instantSchema,
    createdBy: z.string(),
  })
  .meta({ id: 'StoredAnalysis' });

export const storedAnalysisListSchema = z
  .object({
    items: z.array(
      z.object({
        id: idSchema,
        digest: z.string(),
        createdAt: instantSchema,
        createdBy: z.string(),
        note: z.string().nullable(),
        verdict: z.enum(verdicts),
        trials: z.number().int(),
        current: z.boolean().describe('false once the data or the build-up have changed'),
      }),
    ),
  })
  .meta({ id: 'StoredAnalysisList' });

export type AnalysisTrial = z.infer<typeof analysisTrialSchema>;
export type AnalysisOptions = z.infer<typeof analysisOptionsSchema>;
export type AnalysisRequest = z.infer<typeof analysisRequestSchema>;
export type AnalysisResult = z.infer<typeof analysisResultSchema>;
export type ConfigurationResult = z.infer<typeof configurationResultSchema>;
export type Interval = z.infer<typeof intervalSchema>;
export type ModelFit = z.infer<typeof modelFitSchema>;
export type Link = (typeof links)[number];
export type StoredAnalysisInput = z.infer<typeof storedAnalysisInputSchema>;
export type StoredAnalysis = z.infer<typeof storedAnalysisSchema>;
export type StoredAnalysisList = z.infer<typeof storedAnalysisListSchema>;
export type Boundary = z.infer<typeof boundarySchema>;
