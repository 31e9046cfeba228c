import { type ConfigurationResult } from '../../../shared/schemas/analysis.ts';
import { verdicts } from '../../../shared/schemas/verdict.ts';

/** The configuration with the worst verdict: the one to look at when nobody has chosen. */
export function worstConfiguration(
  configurations: readonly ConfigurationResult[],
): ConfigurationResult | null {
  const rank = ({ verdict }: ConfigurationResult) => verdicts.indexOf(verdict);
  return configurations.reduce<ConfigurationResult | null>(
    (worst, one) => (worst === null || rank(one) < rank(worst) ? one : worst),
    null,
  );
}
