import type { AnalysisTrial } from '../schemas/analysis.ts';

/** A part seated once and stepped up until it slipped: one threshold, not independent trials. */
export interface StepUpSeries {
  series: string;
  configuration: string;
  trials: number;
  /** The threshold lies above this, rad/s². */
  lastHeld: number;
  /** … and at or below this, rad/s². */
  slipped: number;
}

/**
 * Splits off the step-up series. A series is stepped up when at least two trials carry its name in
 * one configuration, their accelerations rise strictly in run order (in order of appearance where
 * no order is given), and only the last of them failed. Anything else stays single trials.
 */
export function splitSeries(
  trials: readonly AnalysisTrial[],
  failed: (trial: AnalysisTrial) => boolean,
): { single: AnalysisTrial[]; series: StepUpSeries[] } {
  const groups = new Map<string, AnalysisTrial[]>();
  for (const trial of trials) {
    if (trial.series === undefined) continue;
    const key = JSON.stringify([trial.configuration, trial.series]);
    const group = groups.get(key);
    if (group) group.push(trial);
    else groups.set(key, [trial]);
  }
  const stepped = new Set<AnalysisTrial>();
  const series: StepUpSeries[] = [];
  for (const group of groups.values()) {
    const run = group.every((trial) => trial.order !== undefined)
      ? [...group].sort((x, y) => x.order! - y.order!)
      : group;
    const last = run[run.length - 1];
    const rises = run.every((t, i) => i === 0 || t.acceleration > run[i - 1].acceleration);
    const endsInSlip = run.every((t) => failed(t) === (t === last));
    if (run.length < 2 || !rises || !endsInSlip) continue;
    run.forEach((trial) => stepped.add(trial));
    series.push({
      series: last.series!,
      configuration: last.configuration,
      trials: run.length,
      lastHeld: run[run.length - 2].acceleration,
      slipped: last.acceleration,
    });
  }
  return { single: trials.filter((trial) => !stepped.has(trial)), series };
}
