import { useQuery } from '@tanstack/react-query';
import { useCallback, useMemo } from 'react';
import type { Trial } from '../../../shared/schemas/trial.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import type { ChartTheme } from '../../charts/chartTheme.ts';
import { drawRunOrder, type RunOrderTrial } from '../../charts/drawRunOrder.ts';
import { MapKey } from '../../charts/MapKey.tsx';
import { Plot } from '../../charts/Plot.tsx';
import { trialWords } from '../../charts/trialWords.ts';
import { ErrorState } from '../../ui/ErrorState.tsx';
import { Loading } from '../../ui/Loading.tsx';
import { placeInOrder } from './placeInOrder.ts';
import { allTrialsQuery } from './trialQueries.ts';

/** Acceleration against run order, over all trials of the fixture. */
export function RunOrder({ fixtureId }: { fixtureId: number }) {
  const all = useQuery(allTrialsQuery(fixtureId));
  const trials = useMemo(() => placeInOrder(all.data ?? []).map(marked), [all.data]);
  const draw = useCallback((theme: ChartTheme) => drawRunOrder(trials, theme), [trials]);
  if (all.isPending) return <Loading />;
  if (all.isError) return <ErrorState error={all.error} retry={() => void all.refetch()} />;
  return (
    <Plot
      draw={draw}
      alternative={`Acceleration of ${trials.length} trials in the order they were run: ${count(trials, 'held')} held, ${count(trials, 'slipped')} slipped, ${count(trials, 'lost')} lost.`}
      height="h-[18rem]"
      chartKey={<MapKey drawn={[]} excluded={trials.some(({ excluded }) => excluded)} />}
      tableTitle="The picture as a table"
      table={<RunOrderTable trials={trials} />}
    />
  );
}

function marked({ trial, order }: { trial: Trial; order: number }): RunOrderTrial {
  const { id, acceleration, outcome, excluded } = trial;
  return { id, order, acceleration, outcome, excluded, words: trialWords(trial) };
}

function count(trials: readonly RunOrderTrial[], outcome: Trial['outcome']): number {
  return trials.filter((trial) => trial.outcome === outcome).length;
}

function RunOrderTable({ trials }: { trials: readonly RunOrderTrial[] }) {
  return (
    <table className="w-full text-sm">
      <thead>
        <tr>
          <th scope="col" className="text-right">
            Order
          </th>
          <th scope="col" className="text-right">
            Acceleration, rad/s²
          </th>
          <th scope="col" className="pl-3 text-left">
            Trial
          </th>
        </tr>
      </thead>
      <tbody>
        {trials.map(({ id, order, acceleration, words }) => (
          <tr key={id} className="border-t border-line">
            <td className="text-right tabular-nums">{order}</td>
            <td className="text-right tabular-nums">{formatQuantity(acceleration)}</td>
            <td className="pl-3">{words}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
