import type { Data } from 'plotly.js';
import { type Interval } from '../../../shared/schemas/analysis.ts';
import { type ChartTheme, withOpacity } from '../chartTheme.ts';
import { interpolateLog, type Knot } from '../interpolate.ts';
import { alongX, type MapFrame } from './mapFrame.ts';
import { type MapScene } from './mapScene.ts';

/** A curve ready to draw; a null height is a gap. */
interface Curve {
  x: number[];
  y: (number | null)[];
}

/** Acceleration τ/J along x; τ in N·m, one number or by place. */
function torqueCurve(
  scene: MapScene,
  xs: readonly number[],
  torque: number | ((x: number) => number),
): Curve {
  const y = xs.map((x) => {
    const inertia = scene.view === 'inertia' ? x : scene.inertiaAt(x);
    if (inertia === null || !(inertia > 0)) return null;
    return (typeof torque === 'number' ? torque : torque(x)) / inertia;
  });
  return { x: [...xs], y };
}

/** The holding bound (kinetic μ), the letting-go bound (static μ) and what lies between. */
export function theoryCurves(scene: MapScene, frame: MapFrame, theme: ChartTheme): Data[] {
  const xs = alongX(frame);
  const bound = (height: (column: MapFrame['columns'][number]) => number | null): Curve | null => {
    const knots = frame.columns.flatMap((column): Knot[] => {
      const value = height(column);
      return value === null ? [] : [{ x: column.x, y: value * column.inertia }];
    });
    return knots.length === 0 ? null : torqueCurve(scene, xs, (x) => interpolateLog(knots, x));
  };
  const holding = bound(({ holding }) => holding);
  const lettingGo = bound(({ lettingGo }) => lettingGo);
  const data: Data[] = [];
  if (holding !== null && lettingGo !== null) {
    data.push(band('theory band', holding, lettingGo, withOpacity(theme.line, 0.5)));
  }
  for (const [name, curve, dash] of [
    ['holding bound', holding, 'dash'],
    ['letting-go bound', lettingGo, 'longdash'],
  ] as const) {
    if (curve !== null) data.push(line(name, curve, theme.ink, 1.3, dash));
  }
  return data;
}

/** The common 50 % curve, solid, with the soft band of its interval; an open end runs to the edge. */
export function fittedCurves(scene: MapScene, frame: MapFrame, theme: ChartTheme): Data[] {
  const torque50: Interval | null = scene.torque50;
  if (torque50 === null || torque50.estimate === null) return [];
  const xs = alongX(frame);
  const edge = (height: number): Curve => ({ x: xs, y: xs.map(() => height) });
  const lower = torque50.lower === null ? edge(frame.y[0]) : torqueCurve(scene, xs, torque50.lower);
  const upper = torque50.upper === null ? edge(frame.y[1]) : torqueCurve(scene, xs, torque50.upper);
  return [
    band('interval of the fitted curve', lower, upper, withOpacity(theme.ink, 0.14)),
    line('fitted 50 % curve', torqueCurve(scene, xs, torque50.estimate), theme.ink, 2, 'solid'),
  ];
}

/**
 * The working limit as a function of position, drawn only over the tested range and never above
 * the drive's limit, and the drive's limit itself.
 */
export function limitCurves(scene: MapScene, frame: MapFrame, theme: ChartTheme): Data[] {
  const data: Data[] = [];
  const tested = frame.columns.filter(({ workingLimit }) => workingLimit !== null);
  const first = tested[0];
  const last = tested.at(-1);
  if (scene.limitTorque !== null && first !== undefined && last !== undefined) {
    const xs = alongX({ ...frame, x: [first.x, last.x] });
    const curve = torqueCurve(scene, xs, scene.limitTorque);
    const cap = scene.driveLimit ?? Number.POSITIVE_INFINITY;
    const capped = curve.y.map((height) => (height === null ? null : Math.min(height, cap)));
    data.push(line('working limit', { x: xs, y: capped }, theme.limit, 2.5, 'solid'));
  }
  if (scene.driveLimit !== null && scene.driveLimit <= frame.y[1]) {
    const height = scene.driveLimit;
    data.push(
      line('drive limit', { x: [...frame.x], y: [height, height] }, theme.muted, 1.5, 'dot'),
    );
  }
  return data;
}

function line(name: string, { x, y }: Curve, color: string, width: number, dash: string): Data {
  const style = { color, width, dash: dash as 'solid' };
  return {
    type: 'scatter',
    mode: 'lines',
    name,
    x,
    y,
    line: style,
    hoverinfo: 'skip',
    showlegend: false,
  };
}

/** A filled strip between two curves over the same places; gaps are left out. */
function band(name: string, lower: Curve, upper: Curve, fillcolor: string): Data {
  const kept = lower.x.flatMap((x, i): { x: number; low: number; high: number }[] => {
    const low = lower.y[i] ?? null;
    const high = upper.y[i] ?? null;
    return low === null || high === null ? [] : [{ x, low, high }];
  });
  const back = [...kept].reverse();
  return {
    type: 'scatter',
    mode: 'lines',
    name,
    x: [...kept.map(({ x }) => x), ...back.map(({ x }) => x)],
    y: [...kept.map(({ low }) => low), ...back.map(({ high }) => high)],
    fill: 'toself',
    fillcolor,
    line: { width: 0, color: fillcolor },
    hoverinfo: 'skip',
    showlegend: false,
  };
}
