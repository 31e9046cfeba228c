import type { AnalysisRequest, AnalysisTrial } from '../schemas/analysis.ts';
import type { Cells } from './cells.ts';
import { TIE } from './order.ts';
import { splitSeries, type StepUpSeries } from './series.ts';

/** One configuration with what the fit and the checks need of it. */
export interface ConfigurationData {
  label: string;
  /** kg·m². */
  inertia: number;
  /** J_c = I_c·K/T_c, the inertia at which one common torque K per μ would act. */
  equivalentInertia: number;
  /** N·m per unit of μ and its relative standard uncertainty, null when not sent. */
  torquePerMu: { value: number; relativeUncertainty: number } | null;
  inertiaRelativeUncertainty: number;
  /** Trials in the fit. */
  trials: AnalysisTrial[];
  slips: number;
  highestHeld: number | null;
  lowestSlipped: number | null;
  series: StepUpSeries[];
}

export interface BoundaryData {
  configurations: ConfigurationData[];
  cells: Cells;
  /** z = ln α + ln J − centre. */
  centre: number;
  /** Torque per μ of the first configuration, N·m. */
  referenceTorque: number | null;
  /** Trials sent. */
  sent: readonly AnalysisTrial[];
  series: StepUpSeries[];
}

/** The part of a request that says which trials and which inertias. */
export type CollectRequest = Pick<
  AnalysisRequest,
  'trials' | 'torquePerMu' | 'inertiaRelativeUncertainty' | 'failure'
>;

/** A failure is a slip or a loss, or a loss only, as the analyst chose. */
export function isFailure(failure: AnalysisRequest['failure']): (trial: AnalysisTrial) => boolean {
  return failure === 'lost'
    ? (trial) => trial.outcome === 'lost'
    : (trial) => trial.outcome !== 'held';
}

/** Seat torque per unit of μ of one configuration, from any of the forms of the request. */
export function torqueOf(
  torquePerMu: AnalysisRequest['torquePerMu'],
  label: string,
): { value: number; relativeUncertainty: number } | null {
  if (torquePerMu === undefined) return null;
  if (typeof torquePerMu === 'number') return { value: torquePerMu, relativeUncertainty: 0 };
  if (isMeasured(torquePerMu)) return torquePerMu;
  const own = Object.hasOwn(torquePerMu, label) ? torquePerMu[label] : undefined;
  return own === undefined ? null : torqueOf(own, label);
}

function isMeasured(torque: object): torque is { value: number; relativeUncertainty: number } {
  return (
    'value' in torque &&
    typeof torque.value === 'number' &&
    'relativeUncertainty' in torque &&
    typeof torque.relativeUncertainty === 'number' &&
    Object.keys(torque).length === 2
  );
}

/**
 * Trials collapsed to counts per distinct (configuration, acceleration), configurations in order of
 * first appearance. Step-up series are split off: they stay out of the fit.
 */
export function collect(request: CollectRequest): BoundaryData {
  const failed = isFailure(request.failure);
  const { single, series } = splitSeries(request.trials, failed);
  const configurations: ConfigurationData[] = [];
  const index = new Map<string, number>();
  for (const trial of request.trials) {
    if (index.has(trial.configuration)) continue;
    index.set(trial.configuration, configurations.length);
    const label = trial.configuration;
    const uncertainties = request.inertiaRelativeUncertainty;
    configurations.push({
      label,
      inertia: trial.inertia,
      equivalentInertia: trial.inertia,
      torquePerMu: torqueOf(request.torquePerMu, label),
      inertiaRelativeUncertainty:
        uncertainties && Object.hasOwn(uncertainties, label) ? uncertainties[label] : 0,
      trials: [],
      slips: 0,
      highestHeld: null,
      lowestSlipped: null,
      series: series.filter((s) => s.configuration === label),
    });
  }
  const referenceTorque = configurations[0]?.torquePerMu?.value ?? null;
  for (const c of configurations) {
    if (referenceTorque !== null && c.torquePerMu !== null) {
      c.equivalentInertia = (c.inertia * referenceTorque) / c.torquePerMu.value;
    }
  }

  const counts = configurations.map(() => new Map<number, { n: number; k: number }>());
  for (const trial of single) {
    const at = index.get(trial.configuration)!;
    const c = configurations[at];
    c.trials.push(trial);
    const { acceleration } = trial;
    const cell = counts[at].get(acceleration) ?? { n: 0, k: 0 };
    cell.n += 1;
    if (failed(trial)) {
      cell.k += 1;
      c.slips += 1;
      c.lowestSlipped = Math.min(c.lowestSlipped ?? Infinity, acceleration);
    } else {
      c.highestHeld = Math.max(c.highestHeld ?? 0, acceleration);
    }
    counts[at].set(acceleration, cell);
  }
  const { cells, centre } = toCells(configurations, counts);
  return { configurations, cells, centre, referenceTorque, sent: request.trials, series };
}

/** Makes predictors equal that differ by no more than the tie tolerance, so that ties are exact. */
function snapTies(rows: { z: number }[]): void {
  let anchor = -Infinity;
  for (const row of [...rows].sort((x, y) => x.z - y.z)) {
    if (row.z - anchor <= TIE) row.z = anchor;
    else anchor = row.z;
  }
}

function toCells(
  configurations: readonly ConfigurationData[],
  counts: readonly Map<number, { n: number; k: number }>[],
): { cells: Cells; centre: number } {
  const rows = configurations.flatMap((c, configuration) => {
    const lnJ = Math.log(c.equivalentInertia);
    return [...counts[configuration]]
      .sort(([x], [y]) => x - y)
      .map(([acceleration, { n, k }]) => ({
        configuration,
        z: Math.log(acceleration) + lnJ,
        n,
        k,
      }));
  });
  snapTies(rows);
  const centre = rows.reduce((sum, row) => sum + row.z, 0) / Math.max(1, rows.length);
  return {
    centre,
    cells: {
      size: rows.length,
      configurations: configurations.length,
      configuration: Int32Array.from(rows, (row) => row.configuration),
      z: Float64Array.from(rows, (row) => row.z - centre),
      n: Float64Array.from(rows, (row) => row.n),
      k: Float64Array.from(rows, (row) => row.k),
    },
  };
}

/**
 * The same data without the configurations that have no trial in the fit (all their trials being
 * step-up series), and the place of each remaining one in the whole.
 */
export function withTrials(data: BoundaryData): { data: BoundaryData; places: number[] } {
  const { configurations, cells } = data;
  const places = configurations.flatMap((c, i) => (c.trials.length > 0 ? [i] : []));
  if (places.length === configurations.length) return { data, places };
  const kept = new Map(places.map((place, i) => [place, i]));
  return {
    places,
    data: {
      ...data,
      configurations: places.map((place) => configurations[place]),
      cells: {
        ...cells,
        configurations: places.length,
        configuration: cells.configuration.map((place) => kept.get(place)!),
      },
    },
  };
}
