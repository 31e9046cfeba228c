import { useCallback, useMemo } from 'react';
import type { AnalysisResult, Boundary } from '../../../shared/schemas/analysis.ts';
import type { Trial } from '../../../shared/schemas/trial.ts';
import { drawBoundaryMap } from '../../charts/boundaryMap/drawBoundaryMap.ts';
import type { ChartTheme } from '../../charts/chartTheme.ts';
import { type KeyLine, MapKey } from '../../charts/MapKey.tsx';
import { Plot } from '../../charts/Plot.tsx';
import { Panel } from '../../ui/Panel.tsx';
import { Segments } from '../../ui/Segments.tsx';
import { mapAlternative } from './mapAlternative.ts';
import { isSetApart, mapSceneOf } from './mapSceneOf.ts';
import { MapTable } from './MapTable.tsx';
import type { MapViewState } from './useMapView.ts';

interface BoundaryMapProps {
  boundary: Boundary;
  trials: readonly Trial[];
  driveLimit: number | null;
  chosen: string | null;
  state: MapViewState;
  /** id of a trial, or the label of a configuration, whose mark was clicked */
  onChoose: (mark: string) => void;
}

/** The map with its two switches; both are kept in the URL. */
export function BoundaryMap(props: BoundaryMapProps) {
  const { boundary, trials, driveLimit, chosen, state, onChoose } = props;
  const { view, scale } = state;
  const scene = useMemo(
    () => mapSceneOf(boundary, trials, driveLimit, { view, scale, chosen }),
    [boundary, trials, driveLimit, view, scale, chosen],
  );
  const draw = useCallback(
    (theme: ChartTheme) =>
      scene === null ? { data: [], layout: {} } : drawBoundaryMap(scene, theme),
    [scene],
  );
  const { result } = boundary;
  if (scene === null || result === null) return null;
  return (
    <Panel
      title="Map"
      actions={
        <div className="flex flex-wrap gap-2">
          <Segments
            label="Acceleration against"
            value={scene.view}
            options={[
              { value: 'inertia', text: 'inertia' },
              { value: 'position', text: 'position' },
            ]}
            onChange={(next) => state.change({ view: next })}
          />
          <Segments
            label="Scale"
            value={scale}
            options={[
              { value: 'log', text: 'log' },
              { value: 'linear', text: 'linear' },
            ]}
            onChange={(next) => state.change({ scale: next })}
          />
        </div>
      }
    >
      <Plot
        draw={draw}
        alternative={mapAlternative(result, scene.view)}
        height="h-[24rem] sm:h-[30rem]"
        chartKey={
          <MapKey
            drawn={keyLines(boundary, driveLimit)}
            excluded={trials.some((one) => one.excluded)}
            fits={fitMarks(result)}
          />
        }
        tableTitle="The picture as a table"
        table={<MapTable configurations={result.configurations} trials={trials} />}
        onChoose={onChoose}
      />
    </Panel>
  );
}

function keyLines({ result }: Boundary, driveLimit: number | null): KeyLine[] {
  const lines: KeyLine[] = [];
  if (result === null) return lines;
  const theory = result.configurations.some(
    (one) => one.theory.holding !== null || one.theory.lettingGo !== null,
  );
  if (theory) lines.push('theory');
  if (result.commonTorque50.estimate !== null) lines.push('fitted');
  if (result.configurations.some(({ workingLimit }) => workingLimit !== null)) lines.push('limit');
  if (driveLimit !== null) lines.push('drive');
  return lines;
}

function fitMarks({ configurations }: AnalysisResult): ('fitted' | 'set apart')[] {
  const fitted = configurations.filter(({ alpha50 }) => alpha50.offsets.estimate !== null);
  const marks: ('fitted' | 'set apart')[] = [];
  if (fitted.some((one) => !isSetApart(one))) marks.push('fitted');
  if (fitted.some(isSetApart)) marks.push('set apart');
  return marks;
}
