import { type Interval } from '../../../shared/schemas/analysis.ts';
import { type Outcome } from '../../../shared/schemas/trial.ts';

export const mapViews = ['inertia', 'position'] as const;
export const mapScales = ['log', 'linear'] as const;

export type MapView = (typeof mapViews)[number];
export type MapScale = (typeof mapScales)[number];

/** One column of the map; accelerations in rad/s², inertia in kg·m². */
export interface MapConfiguration {
  label: string;
  /** null where the position is not known: it then stands only in the inertia view */
  positionMm: number | null;
  inertia: number;
  /** the 50 % acceleration the verdict rests on; a missing end is null */
  alpha50: Interval;
  /** not on the common curve: drawn with its own mark */
  setApart: boolean;
  holding: number | null;
  lettingGo: number | null;
  workingLimit: number | null;
}

/** One trial; `words` is its hover text, plain (it is escaped when drawn). */
export interface MapTrial {
  id: string;
  configuration: string;
  acceleration: number;
  outcome: Outcome;
  excluded: boolean;
  /** in the log that is about to be stored: drawn in front of the others */
  fresh: boolean;
  words: string;
}

/** Everything the map shows. */
export interface MapScene {
  view: MapView;
  scale: MapScale;
  configurations: readonly MapConfiguration[];
  trials: readonly MapTrial[];
  /** torque of the common 50 % curve, N·m */
  torque50: Interval | null;
  /** torque of the working-limit function, N·m */
  limitTorque: number | null;
  /** rad/s² */
  driveLimit: number | null;
  /** position in mm → kg·m² */
  inertiaAt: (positionMm: number) => number | null;
  chosen: string | null;
}
