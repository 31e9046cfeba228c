import Plotly from 'plotly.js';
import createPlotlyComponent, { type PlotParams } from 'react-plotly.js/factory';

/**
 * The one place that loads plotly. It weighs more than the rest of the client together: import it
 * lazily only (`Plot` does), never from an entry.
 */
const PlotlyPlot = createPlotlyComponent(Plotly);

export default function PlotCanvas(params: PlotParams) {
  return <PlotlyPlot {...params} />;
}
