import type { Data } from 'plotly.js';
import { outcomes, type Outcome } from '../../shared/schemas/trial.ts';
import { type ChartTheme } from './chartTheme.ts';
import { type Drawing } from './drawing.ts';
import { escapeMarkup } from './escapeMarkup.ts';
import { outcomeMarks } from './outcomeMarks.ts';

/** One trial in the order it was run; `words` is its hover text, plain. */
export interface RunOrderTrial {
  id: number;
  order: number;
  acceleration: number;
  outcome: Outcome;
  excluded: boolean;
  words: string;
}

/** Acceleration against run order: drift and stepped series show as a pattern. */
export function drawRunOrder(trials: readonly RunOrderTrial[], theme: ChartTheme): Drawing {
  const data = [true, false].flatMap((excluded) =>
    outcomes.flatMap((outcome): Data[] => {
      const those = trials.filter(
        (trial) => trial.outcome === outcome && trial.excluded === excluded,
      );
      return those.length === 0 ? [] : [marks(those, outcome, excluded, theme)];
    }),
  );
  return {
    data,
    layout: {
      xaxis: { type: 'linear', title: { text: 'run order', standoff: 8 }, nticks: 8 },
      yaxis: {
        type: 'linear',
        rangemode: 'tozero',
        title: { text: 'acceleration, rad/s²', standoff: 8 },
        nticks: 6,
      },
      margin: { t: 10, r: 12, b: 48, l: 58 },
    },
  };
}

function marks(
  trials: readonly RunOrderTrial[],
  outcome: Outcome,
  excluded: boolean,
  theme: ChartTheme,
): Data {
  const { word, symbol, excludedSymbol, color } = outcomeMarks[outcome];
  const paint = excluded ? theme.muted : color(theme);
  return {
    type: 'scatter',
    mode: 'markers',
    name: excluded ? `${word}, excluded` : word,
    x: trials.map(({ order }) => order),
    y: trials.map(({ acceleration }) => acceleration),
    customdata: trials.map(({ id }) => id),
    hovertext: trials.map(({ words }) => escapeMarkup(words)),
    hoverinfo: 'text',
    opacity: excluded ? 0.6 : 1,
    marker: {
      symbol: excluded ? excludedSymbol : symbol,
      size: 8,
      color: paint,
      line: { color: paint, width: 2 },
    },
    showlegend: false,
  };
}
