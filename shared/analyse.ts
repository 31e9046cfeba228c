import type { AnalysisRequest, AnalysisResult } from './schemas/analysis.ts';
import { fitBoundary, type BoundaryFit } from './boundary/fitBoundary.ts';
import { checkRequest } from './checkRequest.ts';
import { judge } from './judge.ts';

const lastFits = new WeakMap<AnalysisRequest['trials'], { key: string; fit: BoundaryFit }>();

/** The last fit of a trials array, as long as nothing it depends on has changed. */
function fitOf(request: AnalysisRequest): BoundaryFit {
  const { trials, torquePerMu, inertiaRelativeUncertainty } = request;
  const { estimator, link, failure, confidence, target } = request;
  const key = JSON.stringify([
    trials.length,
    torquePerMu,
    inertiaRelativeUncertainty,
    estimator,
    link,
    failure,
    confidence,
    target,
  ]);
  const last = lastFits.get(trials);
  if (last?.key === key) return last.fit;
  const fit = fitBoundary(request);
  lastFits.set(trials, { key, fit });
  return fit;
}

/**
 * The one door of the numerical core: trials and options in, the whole analysis out. Pure: the same
 * request gives the same result. Calling again with the same `trials` array and other friction,
 * margin, rule, limits or tolerance does not fit again (the array is taken as immutable).
 *
 * @throws RangeError if the request contradicts itself (see `checkRequest`), naming the field
 */
export function analyse(request: AnalysisRequest): AnalysisResult {
  const problems = checkRequest(request);
  if (problems.length > 0) {
    throw new RangeError(problems.map(({ path, message }) => `${path}: ${message}`).join('; '));
  }
  return judge(fitOf(request), request);
}
