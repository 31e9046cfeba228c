import type { AnalysisResult } from '../../shared/schemas/analysis.ts';

/** Sentences that say what new trials changed, configuration by configuration. */
export function verdictChanges(
  before: AnalysisResult | null,
  after: AnalysisResult | null,
): string[] {
  if (after === null) return [];
  const old = new Map(before?.configurations.map((one) => [one.label, one.verdict]));
  const changes = after.configurations.flatMap(({ label, verdict }) => {
    const was = old.get(label);
    if (was === verdict) return [];
    if (was === undefined) return [`${label} is judged for the first time: ${verdict}.`];
    return [`${label} turned from ${was} to ${verdict}.`];
  });
  return changes.length > 0 ? changes : ['No verdict changed.'];
}
