import { type ChartTheme } from '../chartTheme.ts';
import { type Drawing } from '../drawing.ts';
import { fittedCurves, limitCurves, theoryCurves } from './mapCurves.ts';
import { mapFrame } from './mapFrame.ts';
import { mapLayout } from './mapLayout.ts';
import { fittedMarks, limitMarks, trialMarks } from './mapMarks.ts';
import { type MapScene } from './mapScene.ts';

/**
 * The map of acceleration against moment of inertia (where τ/I is a straight line of slope −1 on
 * log axes) or against position: theory, fit, limits and every trial, back to front.
 *
 * @throws RangeError if no configuration has a place in the view
 */
export function drawBoundaryMap(scene: MapScene, theme: ChartTheme): Drawing {
  const frame = mapFrame(scene);
  return {
    data: [
      ...theoryCurves(scene, frame, theme),
      ...fittedCurves(scene, frame, theme),
      ...limitCurves(scene, frame, theme),
      ...limitMarks(frame, theme),
      ...trialMarks(scene, frame, theme),
      ...fittedMarks(frame, theme),
    ],
    layout: mapLayout(scene, frame, theme),
  };
}
