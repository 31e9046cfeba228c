import { normalQuantile, tQuantile } from '../numeric/distributions.ts';
import type { ConfigurationData } from '../boundary/collect.ts';
import type { AnalysisRequest } from '../schemas/analysis.ts';

/** One friction bound of a configuration. */
export interface Bound {
  /** rad/s². */
  alpha: number;
  /** Relative half-width at the confidence; null with fewer than two friction tests. */
  uncertainty: number | null;
}

export interface Theory {
  kinetic: Bound | null;
  static: Bound | null;
}

type Sample = { mean: number; sd: number; n: number };

/**
 * Relative half-width at `confidence`: Student t of the friction mean, t·s/(√n·mean), and the
 * standard uncertainties of seat torque and inertia times the normal quantile, in quadrature.
 *
 * @source JCGM 100:2008, 5.1 (first-order propagation) and G.3 (Student t)
 */
function halfWidth(
  sample: Sample,
  configuration: ConfigurationData,
  confidence: number,
): number | null {
  if (sample.n < 2) return null;
  const tail = (1 + confidence) / 2;
  const friction =
    (tQuantile(tail, sample.n - 1) * sample.sd) / (Math.sqrt(sample.n) * sample.mean);
  const k = normalQuantile(tail);
  const seat = k * (configuration.torquePerMu?.relativeUncertainty ?? 0);
  const inertia = k * configuration.inertiaRelativeUncertainty;
  return Math.hypot(friction, seat, inertia);
}

/**
 * Accelerations at which friction lets go: α = μ·T/I with T the seat torque per unit of μ; kinetic μ
 * gives the holding bound, static μ the letting-go bound.
 */
export function theoryOf(
  configuration: ConfigurationData,
  friction: AnalysisRequest['friction'],
  confidence: number,
): Theory {
  const bound = (sample: Sample | undefined): Bound | null => {
    const torque = configuration.torquePerMu;
    if (!sample || !torque) return null;
    return {
      alpha: (sample.mean * torque.value) / configuration.inertia,
      uncertainty: halfWidth(sample, configuration, confidence),
    };
  };
  return { kinetic: bound(friction?.kinetic), static: bound(friction?.static) };
}
