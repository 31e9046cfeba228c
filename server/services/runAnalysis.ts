import type { AnalysisRequest, AnalysisResult } from '../../shared/schemas/analysis.ts';
import { checkRequest } from '../../shared/checkRequest.ts';
import type { AppDeps } from '../appDeps.ts';
import { invalid } from '../http/problem.ts';
import type { AnalyseAnswer } from '../workers/analysisWorker.ts';

/**
 * Analyses on a worker thread.
 *
 * @throws ProblemError 422 naming each field that contradicts another; 503 when overloaded
 */
export async function runAnalysis(
  deps: Pick<AppDeps, 'work'>,
  request: AnalysisRequest,
): Promise<AnalysisResult> {
  const problems = checkRequest(request);
  if (problems.length > 0) throw invalid(problems);
  const answer = await deps.work.run<AnalyseAnswer>('analyse', request);
  if ('refused' in answer) throw invalid([{ path: '', message: answer.refused }]);
  return answer.result;
}
