import type { AnalysisResult } from '../schemas/analysis.ts';
import { chiSquareUpper } from '../numeric/distributions.ts';
import type { BoundaryData } from './collect.ts';
import { merged, mergedPower, unconstrained } from './constraint.ts';
import { maximiseUnder } from './fitCommonSlope.ts';
import { finite } from './modelFit.ts';
import type { Models } from './models.ts';
import { scaledInPower } from './powerModel.ts';

export type Comparison = AnalysisResult['comparisons'][number];

function likelihoodRatio(
  simpler: string,
  fuller: string,
  gain: number | null,
  df: number,
): Comparison {
  const statistic = gain === null || df < 1 ? null : finite(Math.max(0, 2 * gain));
  return {
    simpler,
    fuller,
    statistic,
    df,
    p: statistic === null ? null : chiSquareUpper(statistic, df),
  };
}

/**
 * Likelihood-ratio comparisons of nested models: the simpler one is the fuller one under linear
 * constraints, both with the fuller model's penalty. With plain maximum likelihood there is none
 * where the trials separate.
 *
 * @source Heinze & Schemper 2002 (penalised likelihood-ratio test)
 */
export function compareModels(
  data: BoundaryData,
  models: Models,
  penalised: boolean,
): Comparison[] {
  const { scaled, offsets, separate, power } = models;
  const count = data.configurations.length;
  const powerFits = power.fit.status === 'converged' && (penalised || power.separation === 'none');
  const scaledFits = penalised ? scaled.penalised.status === 'converged' : scaled.supremum.attained;
  const offsetsFit = penalised
    ? offsets.penalised.status === 'converged'
    : offsets.supremum.attained;

  const inPower =
    powerFits && scaledFits ? power.fit.value - scaledInPower(power, penalised).value : null;
  const inOffsets =
    !offsetsFit || count === 1
      ? null
      : penalised
        ? offsets.penalised.value - maximiseUnder(offsets.model, merged(count), 'common').value
        : offsets.supremum.logLik - scaled.supremum.logLik;
  return [
    likelihoodRatio('scaled', 'power', inPower, 1),
    likelihoodRatio('scaled', 'offsets', inOffsets, count - 1),
    likelihoodRatio('offsets', 'separate', offsetsInSeparate(), count - 1),
  ];

  function offsetsInSeparate(): number | null {
    if (!offsetsFit || count === 1) return null;
    let full = 0;
    for (const fit of separate) {
      if (fit === null) return null;
      if (penalised ? fit.penalised.status !== 'converged' : !fit.supremum.attained) return null;
      full += penalised ? fit.penalised.value : fit.supremum.logLik;
    }
    if (!penalised) return full - offsets.supremum.logLik;
    return full - maximiseUnder(offsets.model, unconstrained(count), 'separate').value;
  }
}

/** Whether offsets rejects power (df = configurations − 2), with the offsets model's penalty. */
export function powerAgainstOffsets(
  data: BoundaryData,
  models: Models,
  penalised: boolean,
): Comparison | null {
  const { offsets, power } = models;
  const count = data.configurations.length;
  if (count < 3) return null;
  const lnInertia = Float64Array.from(data.configurations, (c) => Math.log(c.equivalentInertia));
  const mean = lnInertia.reduce((sum, value) => sum + value, 0) / count;
  if (penalised) {
    const inside = mergedPower(
      count,
      lnInertia.map((value) => value - mean),
    );
    const gain = offsets.penalised.value - maximiseUnder(offsets.model, inside, 'common').value;
    return likelihoodRatio('power', 'offsets', gain, count - 2);
  }
  if (!offsets.supremum.attained || power.separation !== 'none') return null;
  return likelihoodRatio('power', 'offsets', offsets.supremum.logLik - power.fit.logLik, count - 2);
}
