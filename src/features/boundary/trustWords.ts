import { type AnalysisResult } from '../../../shared/schemas/analysis.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { writtenP } from './checkWords.ts';

/** What speaks for and against the fit, one sentence each. */
export function trustWords(result: AnalysisResult, confidence: number): string[] {
  return [
    separationWords(result),
    driftWords(result.diagnostics.drift, 1 - confidence),
    scatterWords(result.diagnostics.heterogeneity),
  ].filter((words) => words !== null);
}

function separationWords({ separation }: AnalysisResult): string {
  const apart = Object.entries(separation.configurations)
    .filter(([, kind]) => kind !== 'none')
    .map(([label]) => label);
  if (separation.overall === 'complete') {
    return 'All slips lie above all holds: the steepness rests on the penalty, the intervals are wide on purpose.';
  }
  if (apart.length === 0)
    return 'Slips and holds overlap in every configuration, as a fit likes it.';
  return `Slips and holds do not overlap at ${apart.join(', ')}: there the steepness comes from the other configurations.`;
}

function driftWords(
  { change, p }: AnalysisResult['diagnostics']['drift'],
  limit: number,
): string | null {
  if (change === null || p === null) return null;
  const by = `×${formatQuantity(change, { decimals: 2 })} over the series (p ${writtenP(p)})`;
  return p < limit
    ? `The holding torque changed while the trials ran: ${by}. Look at the pads.`
    : `No drift with run order is seen: ${by}.`;
}

function scatterWords({ ratio, p }: AnalysisResult['diagnostics']['heterogeneity']): string | null {
  if (ratio === null || p === null) return null;
  const by = `${formatQuantity(ratio, { decimals: 2 })} times what chance alone gives (p ${writtenP(p)})`;
  return ratio > 1 && p < 0.05
    ? `The trials scatter more than chance: ${by}. The intervals were widened for it.`
    : `The scatter is what chance gives: ${by}.`;
}
