import type { ConfigurationResult } from '../schemas/analysis.ts';
import { binomialUpper, clopperPearsonUpper } from '../numeric/distributions.ts';
import type { Estimate } from '../boundary/fitBoundary.ts';
import type { ConfigurationData } from '../boundary/collect.ts';
import { TIE } from '../boundary/order.ts';

/** Trials at or below a limit and the slips among them. */
export interface AtOrBelow {
  trials: number;
  slips: number;
}

/**
 * Counts at or below `limit` (relative tolerance 1e-9). A step-up series counts as one trial: a
 * slip if it slipped at or below the limit, a hold if it was still holding there, nothing where the
 * limit lies between its last hold and its slip.
 */
export function countAtOrBelow(
  configuration: ConfigurationData,
  failed: (trial: ConfigurationData['trials'][number]) => boolean,
  limit: number,
): AtOrBelow {
  const below = (alpha: number) => alpha <= limit * (1 + TIE);
  const trials = configuration.trials.filter((trial) => below(trial.acceleration));
  let total = trials.length;
  let slips = trials.filter(failed).length;
  for (const series of configuration.series) {
    if (below(series.slipped)) {
      total += 1;
      slips += 1;
    } else if (series.lastHeld >= limit * (1 - TIE)) total += 1;
  }
  return { trials: total, slips };
}

/**
 * Is the working limit supported? In this order: *breached* if even the upper bound of α_target is
 * below it, or if k slips in n are too many for the target (P(X ≥ k) < 1 − confidence); *shown* if
 * the lower bound reaches it and k ≤ n·target rounded down; else *not shown*.
 *
 * @param target - α at the target; its ends are one-sided bounds at `confidence`
 * @source exact binomial test; Clopper & Pearson 1934 (the model-free bound beside it)
 */
export function marginCheck(
  limit: number | null,
  target: Estimate,
  { trials, slips }: AtOrBelow,
  share: number,
  confidence: number,
): ConfigurationResult['margin'] {
  if (limit === null) {
    return {
      state: 'not checked',
      judged: null,
      slipsAtOrBelow: 0,
      trialsAtOrBelow: 0,
      upperBound: null,
    };
  }
  const tooMany = slips > 0 && binomialUpper(slips, trials, share) < 1 - confidence;
  const above = target.upper !== null && target.upper < limit * (1 - TIE);
  const allowed = Math.floor(trials * share * (1 + TIE));
  const reached = target.lower !== null && target.lower >= limit * (1 - TIE);
  return {
    state: tooMany || above ? 'breached' : reached && slips <= allowed ? 'shown' : 'not shown',
    judged: limit,
    slipsAtOrBelow: slips,
    trialsAtOrBelow: trials,
    upperBound: clopperPearsonUpper(slips, trials, confidence),
  };
}
