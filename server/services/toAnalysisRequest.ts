import { fixtureTheory, type FixtureTheory } from '../../shared/physics/fixtureTheory.ts';
import type {
  AnalysisOptions,
  AnalysisRequest,
  AnalysisTrial,
} from '../../shared/schemas/analysis.ts';
import type { TrialRow } from '../entities/TrialRow.ts';
import type { FixtureData } from './fixtureData.ts';

/**
 * Slip that an end mark or the eye would still show, where nobody has said better: half a degree
 * (common practice), the default threshold of a slipped outcome.
 */
const smallestVisibleSlip = (0.5 * Math.PI) / 180;

export type PreparedAnalysis = {
  request: AnalysisRequest | null;
  /** Why there is nothing to analyse, and what to do. */
  reason: string | null;
  theory: FixtureTheory;
};

/** The stored rows of a fixture as the request the numerical core takes. */
export function toAnalysisRequest(data: FixtureData, options: AnalysisOptions): PreparedAnalysis {
  const theory = fixtureTheory(
    data.fixture.spec,
    data.buildUp?.content ?? null,
    data.configurations,
    data.tests,
  );
  const byLabel = new Map(theory.configurations.map((one) => [one.label, one]));
  const labels = new Map(data.configurations.map((row) => [row.id, row.label]));
  const trials: AnalysisTrial[] = [];
  // Configurations keep the order of their positions, whatever order the logs came in.
  for (const { id, label } of data.configurations) {
    const inertia = byLabel.get(label)?.inertia ?? null;
    if (inertia === null) continue;
    for (const row of data.trials) {
      if (row.configurationId === id) trials.push(toTrial(row, labels.get(id) ?? '', inertia));
    }
  }
  if (trials.length === 0) return { request: null, reason: reasonFor(data), theory };

  if (trials.some(({ judgedBy }) => judgedBy === 'end mark' || judgedBy === 'by eye')) {
    theory.notes.push(
      'Some trials were judged by end mark or by eye: it is taken that a slip of 0.5° would have been seen.',
    );
  }
  const used = new Set(trials.map((trial) => trial.configuration));
  const parts = theory.configurations.filter((one) => used.has(one.label));
  const torques = parts.flatMap(({ label, torquePerMu }) =>
    torquePerMu === null ? [] : [[label, torquePerMu] as const],
  );
  const complete = torques.length === parts.length;
  const [first] = torques;
  const same = torques.every(([, torque]) => torque.value === first?.[1].value);
  return {
    request: {
      trials,
      ...(complete && first !== undefined
        ? { torquePerMu: same ? first[1] : Object.fromEntries(torques), friction: theory.friction }
        : {}),
      inertiaRelativeUncertainty: Object.fromEntries(
        parts.map((one) => [one.label, one.inertiaRelativeUncertainty]),
      ),
      moveAngle: theory.moveAngle,
      smallestVisibleSlip,
      drive: theory.drive,
      ...options,
    },
    reason: null,
    theory,
  };
}

function toTrial(row: TrialRow, configuration: string, inertia: number): AnalysisTrial {
  const { acceleration, outcome } = row;
  return {
    ...{ configuration, inertia, acceleration, outcome },
    ...(row.order === null ? {} : { order: row.order }),
    ...(row.batch === null ? {} : { batch: row.batch }),
    ...(row.series === null ? {} : { series: row.series }),
    ...(row.seating === null ? {} : { seating: row.seating }),
    ...(row.part === null ? {} : { part: row.part }),
    ...(row.slipAngle === null ? {} : { slipAngle: row.slipAngle }),
    ...(row.judgedBy === null ? {} : { judgedBy: row.judgedBy }),
  };
}

function reasonFor(data: FixtureData): string {
  if (data.trials.length > 0) {
    return 'No configuration with trials has an inertia: enter the build-up or a measured inertia.';
  }
  if (data.excluded > 0) return 'Every trial is excluded: restore some, or upload new ones.';
  if (data.configurations.length === 0) {
    return 'Nothing to judge yet: enter the build-up and the mass positions, then upload trials.';
  }
  return 'Nothing has been tried yet: upload a log of slip trials.';
}
