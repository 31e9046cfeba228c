import { lazy, type ReactNode, Suspense, useMemo } from 'react';
import { type ChartTheme } from './chartTheme.ts';
import { type Drawing } from './drawing.ts';
import { frameLayout, plotConfig } from './frameLayout.ts';
import { useChartTheme } from './useChartTheme.ts';

const PlotCanvas = lazy(() => import('./PlotCanvas.tsx'));

interface PlotProps {
  /** a pure function of the theme; keep its identity between renders */
  draw: (theme: ChartTheme) => Drawing;
  /** what the picture shows, for those who do not see it */
  alternative: string;
  /** Tailwind height classes */
  height?: string;
  /** the marks' key, beneath the picture */
  chartKey?: ReactNode;
  /** the picture's numbers as a table, behind a disclosure */
  table: ReactNode;
  tableTitle: string;
  /** `customdata` of the mark that was clicked; every such choice is also offered as text */
  onChoose?: (id: string) => void;
}

/** A picture with its text alternative, its key and its numbers as a table. */
export function Plot(props: PlotProps) {
  const { draw, alternative, height = 'h-[22rem]', chartKey, table, tableTitle, onChoose } = props;
  const theme = useChartTheme();
  const drawing = useMemo(() => draw(theme), [draw, theme]);
  const layout = useMemo(
    () => ({ ...frameLayout(drawing.layout, theme), dragmode: canDrag() ? 'zoom' : false }),
    [drawing, theme],
  );
  return (
    <figure className="m-0 min-w-0">
      <div role="img" aria-label={alternative} className={`w-full ${height}`}>
        <Suspense fallback={<Waiting />}>
          <PlotCanvas
            data={drawing.data}
            layout={layout}
            config={plotConfig}
            useResizeHandler
            className="h-full w-full"
            onClick={(event: unknown) => {
              const id = chosenId(event);
              if (id !== null) onChoose?.(id);
            }}
          />
        </Suspense>
      </div>
      {chartKey}
      <details className="mt-2 text-sm print:hidden">
        <summary className="cursor-pointer py-1 text-muted">{tableTitle}</summary>
        <div
          className="mt-2 max-h-80 overflow-auto"
          tabIndex={0}
          role="region"
          aria-label={tableTitle}
        >
          {table}
        </div>
      </details>
    </figure>
  );
}

function Waiting() {
  return (
    <p className="flex h-full items-center justify-center text-sm text-muted">
      Drawing the picture…
    </p>
  );
}

/** Dragging zooms with a mouse; on a touch screen it must scroll the page. */
function canDrag(): boolean {
  return matchMedia('(pointer: fine)').matches;
}

function chosenId(event: unknown): string | null {
  const points = (event as { points?: { customdata?: unknown }[] }).points;
  const id = points?.find((point) => point.customdata !== undefined)?.customdata;
  return typeof id === 'string' || typeof id === 'number' ? String(id) : null;
}
