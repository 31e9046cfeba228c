import type { Boundary } from '../../../shared/schemas/analysis.ts';
import type { Trial } from '../../../shared/schemas/trial.ts';
import type { LogAnswer } from '../../../shared/schemas/trialLog.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import type { MapConfiguration, MapScene } from '../../charts/boundaryMap/mapScene.ts';
import { inertiaCurve } from '../../charts/inertiaCurve.ts';
import { mapSceneOf } from './mapSceneOf.ts';

type Rows = LogAnswer['preview'];

/**
 * The map against position with the rows of a log in front; positions that have no configuration
 * yet get a column of their own.
 */
export function uploadScene(
  boundary: Boundary,
  trials: readonly Trial[],
  driveLimit: number | null,
  rows: Rows,
): MapScene {
  const view = { view: 'position', scale: 'log', chosen: null } as const;
  const present = mapSceneOf(boundary, trials, driveLimit, view);
  const known = new Set(present?.configurations.map(({ label }) => label));
  const fresh = new Map(rows.map(({ configuration, positionMm }) => [configuration, positionMm]));
  const columns = [...fresh]
    .filter(([label]) => !known.has(label))
    .map(([label, positionMm]) => emptyColumn(label, positionMm, boundary));
  return {
    ...view,
    configurations: [...(present?.configurations ?? []), ...columns],
    trials: [
      ...(present?.trials ?? []),
      ...rows.map(({ row, configuration, acceleration, outcome }) => ({
        id: `row ${row}`,
        configuration,
        acceleration,
        outcome,
        excluded: false,
        fresh: true,
        words: `row ${row}: ${configuration}, ${formatQuantity(acceleration)} rad/s², ${outcome}`,
      })),
    ],
    torque50: present?.torque50 ?? null,
    limitTorque: present?.limitTorque ?? null,
    driveLimit,
    inertiaAt: present?.inertiaAt ?? (() => null),
  };
}

function emptyColumn(
  label: string,
  positionMm: number,
  { polynomial }: Boundary,
): MapConfiguration {
  const inertia = polynomial === null ? null : inertiaCurve(polynomial, [])(positionMm);
  return {
    label,
    positionMm,
    inertia: inertia ?? 1,
    alpha50: { estimate: null, lower: null, upper: null },
    setApart: false,
    holding: null,
    lettingGo: null,
    workingLimit: null,
  };
}
