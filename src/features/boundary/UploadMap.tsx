import { useQuery } from '@tanstack/react-query';
import { useCallback, useMemo } from 'react';
import type { LogAnswer } from '../../../shared/schemas/trialLog.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { drawBoundaryMap } from '../../charts/boundaryMap/drawBoundaryMap.ts';
import type { ChartTheme } from '../../charts/chartTheme.ts';
import { MapKey } from '../../charts/MapKey.tsx';
import { Plot } from '../../charts/Plot.tsx';
import { Loading } from '../../ui/Loading.tsx';
import { boundaryQuery, driveLimitQuery, everyTrialQuery } from './boundaryQueries.ts';
import { uploadScene } from './uploadScene.ts';

interface UploadMapProps {
  fixtureId: number;
  rows: LogAnswer['preview'];
}

/** The rows of a log that is not stored yet, over the boundary as it is. */
export function UploadMap({ fixtureId, rows }: UploadMapProps) {
  const boundary = useQuery(boundaryQuery(fixtureId)).data;
  const trials = useQuery(everyTrialQuery(fixtureId)).data;
  const driveLimit = useQuery(driveLimitQuery(fixtureId)).data ?? null;
  const scene = useMemo(
    () =>
      boundary === undefined || trials === undefined
        ? null
        : uploadScene(boundary, trials, driveLimit, rows),
    [boundary, trials, driveLimit, rows],
  );
  const draw = useCallback(
    (theme: ChartTheme) =>
      scene === null ? { data: [], layout: {} } : drawBoundaryMap(scene, theme),
    [scene],
  );
  if (scene === null) return <Loading />;
  return (
    <Plot
      draw={draw}
      alternative={`Acceleration against position: ${rows.length} new trials in front of the ${trials?.length ?? 0} stored ones.`}
      height="h-[18rem]"
      chartKey={
        <>
          <MapKey drawn={[]} excluded={false} />
          <p className="mt-1 text-sm text-muted">Trials that are stored already are faint.</p>
        </>
      }
      tableTitle="The new trials as a table"
      table={<RowsTable rows={rows} />}
    />
  );
}

function RowsTable({ rows }: { rows: LogAnswer['preview'] }) {
  return (
    <table className="w-full text-sm">
      <thead>
        <tr>
          <th scope="col" className="text-right">
            Row
          </th>
          <th scope="col" className="pl-3 text-left">
            Configuration
          </th>
          <th scope="col" className="text-right">
            Acceleration, rad/s²
          </th>
          <th scope="col" className="pl-3 text-left">
            Outcome
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ row, configuration, acceleration, outcome }) => (
          <tr key={row} className="border-t border-line">
            <td className="text-right tabular-nums">{row}</td>
            <td className="pl-3">{configuration}</td>
            <td className="text-right tabular-nums">{formatQuantity(acceleration)}</td>
            <td className="pl-3">{outcome}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
