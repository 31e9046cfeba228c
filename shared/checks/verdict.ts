import type { ConfigurationResult } from '../schemas/analysis.ts';
import { verdicts, type Verdict } from '../schemas/verdict.ts';

/** The worst of several verdicts. */
export function worst(list: readonly Verdict[]): Verdict {
  return verdicts.find((verdict) => list.includes(verdict)) ?? 'not checked';
}

/**
 * Verdict of a configuration: the worst of its three checks. An undecided shape does not count (the
 * demonstrated limit covers it); a check that is missing keeps it from being in line.
 */
export function verdictOf(
  shape: ConfigurationResult['shape']['state'],
  level: ConfigurationResult['level']['state'],
  margin: ConfigurationResult['margin']['state'],
): Verdict {
  const list: Verdict[] = [level];
  if (shape === 'early' || shape === 'late' || shape === 'no common curve') list.push(shape);
  if (margin !== 'shown') list.push(margin);
  return worst(list);
}
