import {
  type Boundary,
  type ConfigurationResult,
  type Interval,
} from '../../../shared/schemas/analysis.ts';
import { type Trial } from '../../../shared/schemas/trial.ts';
import { type MapScale, type MapScene, type MapView } from '../../charts/boundaryMap/mapScene.ts';
import { inertiaCurve } from '../../charts/inertiaCurve.ts';
import { trialWords } from '../../charts/trialWords.ts';

interface View {
  view: MapView;
  scale: MapScale;
  chosen: string | null;
}

/** Whether the step-down search took the configuration off the common curve. */
export function isSetApart({ shape }: ConfigurationResult): boolean {
  return shape.state === 'early' || shape.state === 'late';
}

/**
 * The 50 % acceleration the verdict of a configuration rests on: from the common torque while the
 * configuration is on the common curve, else its own.
 */
export function judgedAlpha50(
  configuration: ConfigurationResult,
  commonTorque50: Interval,
): Interval & { own: boolean } {
  const own = isSetApart(configuration) || configuration.shape.state === 'no common curve';
  if (own || commonTorque50.estimate === null) {
    const { scaled, offsets } = configuration.alpha50;
    return { ...(own || scaled.estimate === null ? offsets : scaled), own };
  }
  const over = (torque: number | null) => (torque === null ? null : torque / configuration.inertia);
  return {
    estimate: over(commonTorque50.estimate),
    lower: over(commonTorque50.lower),
    upper: over(commonTorque50.upper),
    own: false,
  };
}

/**
 * What the map shows. Each configuration carries its *own* fitted 50 % acceleration, so that one
 * off the common curve is seen to be off it.
 *
 * @returns null while there is no result
 */
export function mapSceneOf(
  boundary: Boundary,
  trials: readonly Trial[],
  driveLimit: number | null,
  view: View,
): MapScene | null {
  const { result } = boundary;
  if (result === null || result.configurations.length === 0) return null;
  const positions = new Map(boundary.positions.map(({ label, positionMm }) => [label, positionMm]));
  const configurations = result.configurations.map((one) => ({
    label: one.label,
    positionMm: positions.get(one.label) ?? null,
    inertia: one.inertia,
    alpha50: one.alpha50.offsets,
    setApart: isSetApart(one),
    holding: one.theory.holding,
    lettingGo: one.theory.lettingGo,
    workingLimit: one.workingLimit,
  }));
  const knots = configurations.flatMap(({ positionMm, inertia }) =>
    positionMm === null ? [] : [{ x: positionMm, y: inertia }],
  );
  return {
    ...view,
    view: knots.length === 0 ? 'inertia' : view.view,
    configurations,
    trials: trials.map((trial) => ({
      id: trialMark(trial.id),
      configuration: trial.configuration,
      acceleration: trial.acceleration,
      outcome: trial.outcome,
      excluded: trial.excluded,
      fresh: false,
      words: trialWords(trial),
    })),
    torque50: result.commonTorque50,
    limitTorque: result.limitFunction?.torque ?? null,
    driveLimit,
    inertiaAt: knots.length === 0 ? () => null : inertiaCurve(boundary.polynomial, knots),
  };
}

/** The name a trial's mark carries in the map, apart from any configuration's label. */
export function trialMark(id: number): string {
  return `trial ${id}`;
}
