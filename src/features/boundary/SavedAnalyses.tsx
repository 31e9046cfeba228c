import { useQuery } from '@tanstack/react-query';
import { VerdictWord } from '../../charts/VerdictWord.tsx';
import { formatMinute } from '../../lib/formatDate.ts';
import { DataTable } from '../../ui/DataTable.tsx';
import { ErrorState } from '../../ui/ErrorState.tsx';
import { Loading } from '../../ui/Loading.tsx';
import { analysesQuery } from './boundaryQueries.ts';

/** What was kept, newest first, and whether the data have moved on since. */
export function SavedAnalyses({ fixtureId }: { fixtureId: number }) {
  const saved = useQuery(analysesQuery(fixtureId));
  if (saved.isPending) return <Loading />;
  if (saved.isError) return <ErrorState error={saved.error} retry={() => void saved.refetch()} />;
  if (saved.data.items.length === 0) {
    return (
      <p className="text-muted">None yet. An analyst saves one when a decision rests on it.</p>
    );
  }
  return (
    <DataTable
      caption="Saved analyses, newest first"
      rows={saved.data.items}
      rowKey={({ id }) => id}
      columns={[
        { key: 'at', title: 'Saved', cell: ({ createdAt }) => formatMinute(createdAt) },
        { key: 'by', title: 'By', cell: ({ createdBy }) => createdBy },
        {
          key: 'verdict',
          title: 'Verdict',
          cell: ({ verdict }) => <VerdictWord verdict={verdict} />,
        },
        { key: 'trials', title: 'Trials', numeric: true, cell: ({ trials }) => trials },
        {
          key: 'current',
          title: 'Data',
          cell: ({ current }) =>
            current ? 'as now' : <span className="font-bold">⚠ older than the data</span>,
        },
        { key: 'note', title: 'Note', cell: ({ note }) => note ?? '–' },
      ]}
    />
  );
}
