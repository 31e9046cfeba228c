import type { Layout } from 'plotly.js';
import { engineeringScale, logTicks, tickLabel } from '../axisTicks.ts';
import { type ChartTheme, withOpacity } from '../chartTheme.ts';
import { escapeMarkup } from '../escapeMarkup.ts';
import { type MapFrame } from './mapFrame.ts';
import { type MapScene } from './mapScene.ts';

type Axis = NonNullable<Layout['xaxis']>;

/** Axes, the column heads and the highlight of the chosen configuration. */
export function mapLayout(scene: MapScene, frame: MapFrame, theme: ChartTheme): Partial<Layout> {
  return {
    // a zoom stays when another configuration is chosen, and goes with another view
    uirevision: `${scene.view} ${scene.scale}`,
    xaxis: scene.view === 'inertia' ? inertiaAxis(frame) : positionAxis(frame),
    yaxis: {
      ...axis(frame.y, frame.yLog),
      title: { text: 'acceleration, rad/s²', standoff: 8 },
    },
    margin: { t: 40, r: 12, b: 48, l: 58 },
    shapes: highlight(scene, frame, theme),
    annotations: columnHeads(scene, frame, theme),
  };
}

function axis([from, to]: readonly [number, number], log: boolean, unit = 1): Partial<Axis> {
  if (!log) return { type: 'linear', range: [from, to], nticks: 7 };
  const values = logTicks(from, to);
  return {
    type: 'log',
    range: [Math.log10(from), Math.log10(to)],
    tickmode: 'array',
    tickvals: values,
    ticktext: values.map((value) => tickLabel(value / unit)),
  };
}

function inertiaAxis(frame: MapFrame): Partial<Axis> {
  const { factor, prefix } = engineeringScale(frame.x[1]);
  const title = { text: `moment of inertia, ${prefix}kg·m²`, standoff: 8 };
  if (frame.xLog) return { ...axis(frame.x, true, factor), title };
  const values = linearTicks(frame.x);
  return {
    ...axis(frame.x, false),
    tickmode: 'array',
    tickvals: values,
    ticktext: values.map((value) => tickLabel(value / factor)),
    title,
  };
}

function positionAxis(frame: MapFrame): Partial<Axis> {
  return { ...axis(frame.x, false), title: { text: 'position, mm', standoff: 8 } };
}

/** Five or so round marks of a linear axis. */
function linearTicks([from, to]: readonly [number, number]): number[] {
  const rough = (to - from) / 5;
  const decade = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 5, 10].find((factor) => factor * decade >= rough) ?? 10) * decade;
  const first = Math.ceil(from / step);
  const count = Math.floor(to / step) - first + 1;
  return Array.from({ length: count }, (_, i) => Number(((first + i) * step).toPrecision(12)));
}

function highlight(scene: MapScene, frame: MapFrame, theme: ChartTheme): Layout['shapes'] {
  const column = frame.columns.find(({ label }) => label === scene.chosen);
  if (column === undefined) return [];
  const middle = frame.xLog ? Math.log10(column.x) : column.x;
  const ends = [middle - frame.halfColumn, middle + frame.halfColumn];
  const [x0, x1] = frame.xLog ? ends.map((end) => 10 ** end) : ends;
  return [
    {
      type: 'rect',
      xref: 'x',
      yref: 'paper',
      x0,
      x1,
      y0: 0,
      y1: 1,
      layer: 'below',
      line: { width: 0 },
      fillcolor: withOpacity(theme.limit, 0.1),
    },
  ];
}

function columnHeads(scene: MapScene, frame: MapFrame, theme: ChartTheme): Layout['annotations'] {
  return frame.columns.map(({ x, label, setApart }) => {
    const chosen = label === scene.chosen;
    const text = `${escapeMarkup(label)}${setApart ? '<br>★ set apart' : ''}`;
    return {
      xref: 'x',
      yref: 'paper',
      x: frame.xLog ? Math.log10(x) : x,
      y: 1,
      yanchor: 'bottom',
      showarrow: false,
      text: chosen ? `<b>${text}</b>` : text,
      font: { size: 12, color: chosen ? theme.limit : theme.muted },
    };
  });
}
