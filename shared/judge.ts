import type { AnalysisRequest, AnalysisResult, ConfigurationResult } from './schemas/analysis.ts';
import { normalQuantile } from './numeric/distributions.ts';
import type { BoundaryFit } from './boundary/fitBoundary.ts';
import { isFailure } from './boundary/collect.ts';
import { levelCheck } from './checks/level.ts';
import { countAtOrBelow, marginCheck } from './checks/margin.ts';
import { notesOf } from './checks/notes.ts';
import { fixtureSentence, sentenceOf } from './checks/sentence.ts';
import { shapeCheck } from './checks/shape.ts';
import { theoryOf } from './checks/theory.ts';
import { verdictOf, worst } from './checks/verdict.ts';
import { limitFunction } from './limits/limitFunction.ts';
import { markDiscount } from './limits/markDiscount.ts';
import { workingLimit } from './limits/workingLimit.ts';

/** Named in every result, so that a stored one says what computed it. */
export const ENGINE = 'tautline-core 1';

/** What a judgement needs beside the fit. */
export type JudgeRequest = Pick<
  AnalysisRequest,
  | 'moveAngle'
  | 'smallestVisibleSlip'
  | 'drive'
  | 'friction'
  | 'rule'
  | 'workingLimits'
  | 'margin'
  | 'tolerance'
>;

/** Judges a fit against theory, margin and limits; nothing is fitted again. */
export function judge(fit: BoundaryFit, request: JudgeRequest): AnalysisResult {
  const { data, settings } = fit;
  const { confidence, target, failure } = settings;
  const failed = isFailure(failure);
  const rules: { byRule: number | null; equivalentInertia: number }[] = [];

  const configurations = data.configurations.map((own, c): ConfigurationResult => {
    const fitted = fit.configurations[c];
    const bounds = theoryOf(own, request.friction, confidence);
    const theory = {
      holding: bounds.kinetic?.alpha ?? null,
      lettingGo: bounds.static?.alpha ?? null,
      holdingUncertainty: bounds.kinetic?.uncertainty ?? null,
      lettingGoUncertainty: bounds.static?.uncertainty ?? null,
    };
    const byTheory = bounds.kinetic ? (1 - request.margin) * bounds.kinetic.alpha : null;
    const discount = markDiscount(own, request);
    const demonstrated =
      fitted.demonstrated === null || discount === null ? null : fitted.demonstrated * discount;
    const limit = workingLimit(request.rule, byTheory, demonstrated, request.drive);
    rules.push({ byRule: limit.byRule, equivalentInertia: own.equivalentInertia });

    const shape = shapeCheck(fit, c, request.tolerance);
    const level = levelCheck(fitted.level50, bounds, request.tolerance, own.trials.length);
    const sent =
      request.workingLimits && Object.hasOwn(request.workingLimits, own.label)
        ? request.workingLimits[own.label]
        : byTheory;
    const tally = countAtOrBelow(own, failed, sent ?? 0);
    const margin = marginCheck(sent, fitted.target, tally, target, confidence);
    const verdict = verdictOf(shape.state, level.state, margin.state);
    const { label, slips, highestHeld, lowestSlipped } = own;
    const trials = own.trials.length;
    const facts = { label, verdict, fit: fitted, theory, shape, level, margin, demonstrated };
    return {
      label,
      inertia: own.inertia,
      trials,
      slips,
      highestHeld,
      lowestSlipped,
      alpha50: {
        scaled: interval(fitted.alpha50.scaled),
        offsets: interval(fitted.alpha50.offsets),
      },
      alphaTarget: { ...interval(fitted.target), model: fitted.source },
      theory,
      demonstrated,
      workingLimit: limit.limit,
      binds: limit.binds,
      shape,
      level,
      margin,
      verdict,
      sentence: sentenceOf({ ...facts, slips, trials, highestHeld, lowestSlipped }, settings),
    };
  });

  const verdict = worst(configurations.map((c) => c.verdict));
  const mu50 = fittedMu(fit);
  const heldOut = data.sent.filter((trial) => trial.outcome === 'held').length;
  return {
    engine: ENGINE,
    status: fit.models.scaled.status,
    estimator: settings.estimator,
    link: settings.link,
    counts: {
      trials: data.sent.length,
      held: heldOut,
      slipped: data.sent.filter((trial) => trial.outcome === 'slipped').length,
      lost: data.sent.filter((trial) => trial.outcome === 'lost').length,
      levels: data.cells.size,
    },
    separation: {
      overall: fit.separation.overall,
      configurations: Object.fromEntries(
        data.configurations.map((c, i) => [c.label, fit.separation.configurations[i]]),
      ),
    },
    models: fit.models,
    comparisons: fit.comparisons,
    torque50: interval(fit.torque50),
    commonTorque50: interval(fit.commonTorque50),
    mu50,
    configurations,
    verdict,
    sentence: fixtureSentence(verdict, configurations, {
      torqueChanges: torqueChanges(fit),
      mu50,
      heterogeneity: fit.heterogeneity,
    }),
    diagnostics: {
      drift: { change: fit.drift.change, p: fit.drift.p },
      heterogeneity: { ratio: fit.heterogeneity.ratio, p: fit.heterogeneity.p },
    },
    limitFunction: limitFunction(rules),
    notes: notesOf(fit, request, configurations),
  };
}

type Interval = { estimate: number | null; lower: number | null; upper: number | null };

function interval({ estimate, lower, upper }: Interval): Interval {
  return { estimate, lower, upper };
}

/**
 * μ₅₀ = τ₅₀/K with K the seat torque per μ of the first configuration; its relative uncertainty is
 * added in quadrature on the log scale.
 */
function fittedMu(fit: BoundaryFit): Interval {
  const { referenceTorque, configurations } = fit.data;
  if (referenceTorque === null) return { estimate: null, lower: null, upper: null };
  const { estimate, lower, upper } = fit.commonTorque50;
  const u = configurations[0]?.torquePerMu?.relativeUncertainty ?? 0;
  const seat = normalQuantile((1 + fit.settings.confidence) / 2) * u;
  // an interval without its estimate has no half-widths to widen; then it stands as it is
  const widen = (end: number | null, sign: 1 | -1) => {
    if (end === null) return null;
    if (estimate === null) return (end * Math.exp(sign * seat)) / referenceTorque;
    const half = Math.hypot(Math.log(end / estimate), seat);
    return (estimate * Math.exp(sign * half)) / referenceTorque;
  };
  return {
    estimate: estimate === null ? null : estimate / referenceTorque,
    lower: widen(lower, -1),
    upper: widen(upper, 1),
  };
}

/** power rejects scaled and offsets does not reject power: the torque changes along the positions. */
function torqueChanges(fit: BoundaryFit): { exponent: number | null } | null {
  const rejected = 1 - fit.settings.confidence;
  const p = fit.comparisons.find((c) => c.simpler === 'scaled' && c.fuller === 'power')?.p ?? null;
  const further = fit.powerAgainstOffsets?.p ?? null;
  if (p === null || further === null || p >= rejected || further < rejected) return null;
  return { exponent: fit.models.power.exponent.estimate };
}
