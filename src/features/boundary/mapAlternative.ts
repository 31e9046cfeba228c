import { type AnalysisResult } from '../../../shared/schemas/analysis.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { formatRange } from '../../charts/formatRange.ts';
import { type MapView } from '../../charts/boundaryMap/mapScene.ts';

/** What the map shows, in words, for those who do not see it. */
export function mapAlternative(result: AnalysisResult, view: MapView): string {
  const against = view === 'inertia' ? 'moment of inertia' : 'position of the masses';
  const { held, slipped, lost, trials } = result.counts;
  const torque = result.commonTorque50;
  const curve =
    torque.estimate === null
      ? 'No common 50 % curve could be fitted.'
      : `The common 50 % curve is a torque of ${formatRange(torque)} N·m over the inertia.`;
  const columns = result.configurations.map(
    ({ label, alpha50, workingLimit, verdict }) =>
      `${label}: ${verdict}, half slip at ${formatRange(alpha50.offsets)}, working limit ` +
      `${formatQuantity(workingLimit, { rounding: 'down' })} rad/s²`,
  );
  return (
    `Acceleration against ${against}: ${trials} trials, ${held} held, ${slipped} slipped, ${lost} lost. ` +
    `${curve} ${columns.join('; ')}.`
  );
}
