import type { AnalysisRequest } from './schemas/analysis.ts';
import { torqueOf } from './boundary/collect.ts';

export interface RequestProblem {
  /** Path of the field, `trials.3.inertia`. */
  path: string;
  message: string;
}

const MOST = 20;

/** Contradictions that a schema cannot see: the first twenty, each with its field and a remedy. */
export function checkRequest(request: AnalysisRequest): RequestProblem[] {
  const problems: RequestProblem[] = [];
  const inertia = new Map<string, number>();
  request.trials.forEach((trial, i) => {
    const { configuration } = trial;
    const first = inertia.get(configuration);
    if (first === undefined) {
      inertia.set(configuration, trial.inertia);
      if (
        request.torquePerMu !== undefined &&
        torqueOf(request.torquePerMu, configuration) === null
      ) {
        problems.push({
          path: `torquePerMu.${configuration}`,
          message: `is missing; send the torque of every configuration or one for all`,
        });
      }
    } else if (Math.abs(first - trial.inertia) > 1e-9 * first) {
      problems.push({
        path: `trials.${i}.inertia`,
        message: `is ${trial.inertia}, but configuration ${configuration} began with ${first}; send one inertia per configuration`,
      });
    }
    for (const field of ['inertia', 'acceleration'] as const) {
      if (!(trial[field] > 0 && Number.isFinite(trial[field]))) {
        problems.push({ path: `trials.${i}.${field}`, message: 'must be a number above 0' });
      }
    }
  });
  if (request.trials.length === 0)
    problems.push({ path: 'trials', message: 'send at least one trial' });
  for (const label of Object.keys(request.workingLimits ?? {})) {
    if (!inertia.has(label)) {
      problems.push({
        path: `workingLimits.${label}`,
        message: 'names a configuration without trials; check the label',
      });
    }
  }
  return problems.slice(0, MOST);
}
