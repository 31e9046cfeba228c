import type { Data } from 'plotly.js';
import { type ParityPoint } from '../../shared/schemas/overview.ts';
import { type Verdict, verdicts } from '../../shared/schemas/verdict.ts';
import { logTicks, tickLabel } from './axisTicks.ts';
import { type ChartTheme } from './chartTheme.ts';
import { type Drawing } from './drawing.ts';
import { escapeMarkup } from './escapeMarkup.ts';
import { formatQuantity } from '../../shared/units/formatQuantity.ts';
import { formatRange } from './formatRange.ts';
import { verdictMarks } from './verdictMarks.ts';

/**
 * Theory limit against fitted limit, one mark a configuration: below the 1:1 line the trials slip
 * earlier than theory says. Both axes are logarithmic and alike. `customdata` is the fixture's id.
 */
export function drawParity(points: readonly ParityPoint[], theme: ChartTheme): Drawing {
  const drawn = points.filter(({ fitted }) => fitted.estimate !== null);
  const [from, to] = extent(drawn);
  const values = logTicks(from, to);
  const axis = {
    type: 'log' as const,
    range: [Math.log10(from), Math.log10(to)] as [number, number],
    tickmode: 'array' as const,
    tickvals: values,
    ticktext: values.map(tickLabel),
  };
  return {
    data: [
      {
        type: 'scatter',
        mode: 'lines',
        name: 'theory = trials',
        x: [from, to],
        y: [from, to],
        line: { color: theme.ink, width: 1.3, dash: 'dash' },
        hoverinfo: 'skip',
        showlegend: false,
      },
      ...whiskers(drawn, [from, to], theme),
      ...verdicts.flatMap((verdict) => {
        const those = drawn.filter((point) => point.verdict === verdict);
        return those.length === 0 ? [] : [marks(those, verdict, theme)];
      }),
    ],
    layout: {
      xaxis: { ...axis, title: { text: 'theory limit, rad/s²', standoff: 8 } },
      yaxis: { ...axis, title: { text: 'fitted limit, rad/s²', standoff: 8 } },
      margin: { t: 10, r: 12, b: 48, l: 58 },
    },
  };
}

function extent(points: readonly ParityPoint[]): [number, number] {
  const all = points.flatMap(({ theory, fitted }) => [theory, fitted.estimate ?? theory]);
  if (all.length === 0) return [1, 100];
  const low = all.reduce((a, b) => Math.min(a, b));
  const high = all.reduce((a, b) => Math.max(a, b));
  return [low / 1.35, high * 1.35];
}

function whiskers(
  points: readonly ParityPoint[],
  [from, to]: readonly [number, number],
  theme: ChartTheme,
): Data[] {
  return (['solid', 'dot'] as const).map((dash) => {
    const x: (number | null)[] = [];
    const y: (number | null)[] = [];
    for (const { theory, fitted } of points) {
      for (const [end, edge] of [
        [fitted.lower, from],
        [fitted.upper, to],
      ] as const) {
        if ((end === null) !== (dash === 'dot')) continue;
        x.push(theory, theory, null);
        y.push(fitted.estimate, end ?? edge, null);
      }
    }
    return {
      type: 'scatter',
      mode: 'lines',
      name: dash === 'solid' ? 'interval' : 'open interval',
      x,
      y,
      line: { color: theme.muted, width: 1.5, dash },
      hoverinfo: 'skip',
      showlegend: false,
    };
  });
}

function marks(points: readonly ParityPoint[], verdict: Verdict, theme: ChartTheme): Data {
  const { symbol, color } = verdictMarks[verdict];
  return {
    type: 'scatter',
    mode: 'markers',
    name: verdict,
    x: points.map(({ theory }) => theory),
    y: points.map(({ fitted }) => fitted.estimate),
    customdata: points.map(({ fixtureId }) => fixtureId),
    hovertext: points.map(
      ({ code, label, theory, fitted }) =>
        `${escapeMarkup(code)}, ${escapeMarkup(label)}: ${verdict}<br>theory ${formatQuantity(theory)}, ` +
        `fitted ${formatRange(fitted)} rad/s²`,
    ),
    hoverinfo: 'text',
    marker: {
      symbol,
      size: 10,
      color: color(theme),
      line: symbol.includes('open')
        ? { color: color(theme), width: 2 }
        : { color: theme.paper, width: 0.75 },
    },
    showlegend: false,
  };
}
