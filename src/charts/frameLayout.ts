import type { Config, Layout } from 'plotly.js';
import { type ChartTheme, withOpacity } from './chartTheme.ts';

/** What every picture has in common, laid under the drawing's own layout. */
export function frameLayout(layout: Partial<Layout>, theme: ChartTheme): Partial<Layout> {
  const axis = {
    color: theme.ink,
    gridcolor: withOpacity(theme.line, 0.7),
    linecolor: theme.line,
    zeroline: false,
    showline: true,
    ticks: 'outside' as const,
    tickcolor: theme.line,
    ticklen: 4,
    automargin: true,
  };
  return {
    ...layout,
    autosize: true,
    paper_bgcolor: 'rgba(0, 0, 0, 0)',
    plot_bgcolor: 'rgba(0, 0, 0, 0)',
    font: { family: theme.fontFamily, size: 13, color: theme.ink },
    hovermode: 'closest',
    hoverlabel: {
      bgcolor: theme.paper,
      bordercolor: theme.muted,
      font: { family: theme.fontFamily, size: 13, color: theme.ink },
      align: 'left',
    },
    showlegend: false,
    xaxis: { ...axis, ...layout.xaxis },
    yaxis: { ...axis, ...layout.yaxis },
  };
}

/** No toolbar, no editing, no links out: a picture, not a program. */
export const plotConfig: Partial<Config> = {
  displayModeBar: false,
  displaylogo: false,
  showTips: false,
  doubleClick: 'reset',
  responsive: false,
};
