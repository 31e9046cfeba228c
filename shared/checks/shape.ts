import type { ConfigurationResult } from '../schemas/analysis.ts';
import type { BoundaryFit } from '../boundary/fitBoundary.ts';

/**
 * Shape state of a configuration: set apart (*early*, *late*), *no common curve*, *on curve* when
 * the 2·confidence − 1 interval of e^δ lies inside 1 ± tolerance, else *undecided*.
 */
export function shapeCheck(
  fit: BoundaryFit,
  c: number,
  tolerance: number,
): ConfigurationResult['shape'] {
  const own = fit.configurations[c];
  const { estimate: ratio, lower, upper } = own.ratio;
  if (fit.data.configurations.filter(({ trials }) => trials.length > 0).length < 2) {
    return { ratio: null, lower: null, upper: null, p: null, state: 'not applicable' };
  }
  const shape = { ratio, lower, upper, p: own.p };
  if (own.setApart !== null) return { ...shape, state: own.setApart };
  if (fit.noCommonCurve) return { ...shape, state: 'no common curve' };
  const { lower: low, upper: high } = own.ratioNarrow;
  const inside = low !== null && high !== null && low >= 1 - tolerance && high <= 1 + tolerance;
  return { ...shape, state: inside ? 'on curve' : 'undecided' };
}
