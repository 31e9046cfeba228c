import type { Data } from 'plotly.js';
import { outcomes, type Outcome } from '../../../shared/schemas/trial.ts';
import { formatRange } from '../formatRange.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { type ChartTheme } from '../chartTheme.ts';
import { escapeMarkup } from '../escapeMarkup.ts';
import { outcomeMarks } from '../outcomeMarks.ts';
import { spreadColumn } from '../spreadColumn.ts';
import { type MapColumn, type MapFrame } from './mapFrame.ts';
import { type MapScene, type MapTrial } from './mapScene.ts';

/** A trial where it is drawn: sideways in its column so that it hides no other. */
export interface PlacedTrial extends MapTrial {
  x: number;
}

/** Two marks closer than this share of the height would cover each other. */
const markShare = 0.022;
/** Sideways step as a share of the width. */
const stepShare = 0.013;

/** Every trial beside its column's middle; trials of a configuration not in this view are left out. */
export function placeTrials(scene: MapScene, frame: MapFrame): PlacedTrial[] {
  const drawnY = (height: number) => (frame.yLog ? Math.log10(height) : height);
  const drawnX = (x: number) => (frame.xLog ? Math.log10(x) : x);
  const bin = markShare * (drawnY(frame.y[1]) - drawnY(frame.y[0]));
  const width = drawnX(frame.x[1]) - drawnX(frame.x[0]);
  return frame.columns.flatMap((column) => {
    const trials = scene.trials.filter((trial) => trial.configuration === column.label);
    const steps = spreadColumn(
      trials.map((trial) => drawnY(trial.acceleration)),
      bin,
    );
    const widest = steps.reduce((most, step) => Math.max(most, Math.abs(step)), 0);
    const step = widest === 0 ? 0 : Math.min(stepShare * width, frame.halfColumn / widest);
    return trials.map((trial, i) => {
      const drawn = drawnX(column.x) + step * (steps[i] ?? 0);
      return { ...trial, x: frame.xLog ? 10 ** drawn : drawn };
    });
  });
}

/** One trace for each outcome, kept and excluded apart; `customdata` is the trial's id. */
export function trialMarks(scene: MapScene, frame: MapFrame, theme: ChartTheme): Data[] {
  const placed = placeTrials(scene, frame);
  const anyFresh = placed.some((trial) => trial.fresh);
  const data: Data[] = [];
  for (const excluded of [true, false]) {
    for (const fresh of [false, true]) {
      for (const outcome of outcomes) {
        const trials = placed.filter(
          (trial) =>
            trial.outcome === outcome && trial.excluded === excluded && trial.fresh === fresh,
        );
        if (trials.length > 0) data.push(marks(trials, outcome, theme, anyFresh));
      }
    }
  }
  return data;
}

function marks(
  trials: readonly PlacedTrial[],
  outcome: Outcome,
  theme: ChartTheme,
  anyFresh: boolean,
): Data {
  const { word, symbol, excludedSymbol, color } = outcomeMarks[outcome];
  const excluded = trials[0]?.excluded ?? false;
  const fresh = trials[0]?.fresh ?? false;
  const paint = excluded ? theme.muted : color(theme);
  return {
    type: 'scatter',
    mode: 'markers',
    name: `${word}${excluded ? ', excluded' : ''}${fresh ? ', new' : ''}`,
    x: trials.map(({ x }) => x),
    y: trials.map(({ acceleration }) => acceleration),
    customdata: trials.map(({ id }) => id),
    hovertext: trials.map(({ words }) => escapeMarkup(words)),
    hoverinfo: 'text',
    opacity: excluded ? 0.6 : anyFresh && !fresh ? 0.35 : 1,
    marker: {
      symbol: excluded ? excludedSymbol : symbol,
      size: (outcome === 'held' ? 7 : 8) + (fresh ? 1 : 0),
      color: paint,
      line: { color: paint, width: symbol === 'x-thin' || excluded ? 2 : 1.5 },
    },
    showlegend: false,
  };
}

/**
 * The fitted 50 % acceleration of each configuration with its interval; an end that these trials do
 * not bound runs dotted to the edge of the picture.
 */
export function fittedMarks(frame: MapFrame, theme: ChartTheme): Data[] {
  const fitted = frame.columns.filter(({ alpha50 }) => alpha50.estimate !== null);
  const bounded: { x: (number | null)[]; y: (number | null)[] } = { x: [], y: [] };
  const open: typeof bounded = { x: [], y: [] };
  for (const { x, alpha50 } of fitted) {
    for (const [end, edge] of [
      [alpha50.lower, frame.y[0]],
      [alpha50.upper, frame.y[1]],
    ] as const) {
      const target = end === null ? open : bounded;
      target.x.push(x, x, null);
      target.y.push(alpha50.estimate, end ?? edge, null);
    }
  }
  const whisker = (name: string, { x, y }: typeof bounded, dash: 'solid' | 'dot'): Data => ({
    type: 'scatter',
    mode: 'lines',
    name,
    x,
    y,
    line: { color: theme.ink, width: 2, dash },
    hoverinfo: 'skip',
    showlegend: false,
  });
  return [
    whisker('interval', bounded, 'solid'),
    whisker('open interval', open, 'dot'),
    ...[false, true].flatMap((setApart) => {
      const columns = fitted.filter((column) => column.setApart === setApart);
      return columns.length === 0 ? [] : [fittedTrace(columns, setApart, theme)];
    }),
  ];
}

function fittedTrace(columns: readonly MapColumn[], setApart: boolean, theme: ChartTheme): Data {
  return {
    type: 'scatter',
    mode: 'markers',
    name: setApart ? 'fitted, set apart' : 'fitted',
    x: columns.map(({ x }) => x),
    y: columns.map(({ alpha50 }) => alpha50.estimate),
    customdata: columns.map(({ label }) => label),
    hovertext: columns.map(
      ({ label, alpha50 }) =>
        `${escapeMarkup(label)}: half slip at ${formatRange(alpha50)} rad/s²${setApart ? ', set apart from the common curve' : ''}`,
    ),
    hoverinfo: 'text',
    marker: {
      symbol: setApart ? 'star' : 'square',
      size: setApart ? 15 : 9,
      color: theme.ink,
      line: { color: theme.paper, width: 1 },
    },
    showlegend: false,
  };
}

/** A teal bar across each column at its working limit. */
export function limitMarks(frame: MapFrame, theme: ChartTheme): Data[] {
  const limited = frame.columns.filter(({ workingLimit }) => workingLimit !== null);
  if (limited.length === 0) return [];
  return [
    {
      type: 'scatter',
      mode: 'markers',
      name: 'working limit of a configuration',
      x: limited.map(({ x }) => x),
      y: limited.map(({ workingLimit }) => workingLimit),
      customdata: limited.map(({ label }) => label),
      hovertext: limited.map(
        ({ label, workingLimit }) =>
          `${escapeMarkup(label)}: working limit ${formatQuantity(workingLimit, { rounding: 'down' })} rad/s²`,
      ),
      hoverinfo: 'text',
      marker: {
        symbol: 'line-ew',
        size: 22,
        color: theme.limit,
        line: { color: theme.limit, width: 3 },
      },
      showlegend: false,
    },
  ];
}
