import type { AnalysisRequest, ConfigurationResult } from '../schemas/analysis.ts';
import { TIE } from '../boundary/order.ts';

/**
 * Rounds down to a multiple of `resolution`; a value within a relative 1e-9 below a multiple counts
 * as that multiple. Resolutions of 1/whole number give the nearest double to the decimal.
 */
export function roundDown(value: number, resolution: number): number {
  const steps = Math.floor((value / resolution) * (1 + TIE));
  const perUnit = Math.round(1 / resolution);
  const exact = perUnit >= 1 && Math.abs(perUnit * resolution - 1) < 1e-12;
  return exact ? steps / perUnit : steps * resolution;
}

export interface WorkingLimit {
  /** The rule's value before drive cap and rounding, rad/s². */
  byRule: number | null;
  /** Capped by the drive and rounded down. */
  limit: number | null;
  binds: ConfigurationResult['binds'];
}

/**
 * Working limit by the analyst's rule: theory with margin, demonstrated, or the lower of both (both
 * must exist). A tie of theory and demonstrated is named demonstrated.
 *
 * @param theory - (1 − margin)·kinetic theory, rad/s²
 */
export function workingLimit(
  rule: AnalysisRequest['rule'],
  theory: number | null,
  demonstrated: number | null,
  drive: AnalysisRequest['drive'],
): WorkingLimit {
  const candidates = {
    theory,
    demonstrated,
    'lower of both':
      theory === null || demonstrated === null ? null : Math.min(theory, demonstrated),
  };
  const byRule = candidates[rule];
  if (byRule === null) return { byRule, limit: null, binds: null };
  const by =
    rule === 'lower of both' ? (byRule === demonstrated ? 'demonstrated' : 'theory') : rule;
  const capped = drive ? Math.min(byRule, drive.maxAcceleration) : byRule;
  const limit = drive?.resolution ? roundDown(capped, drive.resolution) : capped;
  return { byRule, limit, binds: capped < byRule ? 'drive' : by };
}
