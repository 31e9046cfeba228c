import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router';
import type { TrialLogList } from '../../../shared/schemas/trialLog.ts';
import { formatMinute } from '../../lib/formatDate.ts';
import { DataTable } from '../../ui/DataTable.tsx';
import { EmptyState } from '../../ui/EmptyState.tsx';
import { ErrorState } from '../../ui/ErrorState.tsx';
import { Loading } from '../../ui/Loading.tsx';
import { RefusedDialog } from './RefusedDialog.tsx';
import { logsQuery } from './trialQueries.ts';

type Log = TrialLogList['items'][number];

/** The logs the trials came from: who brought them and when, what was refused, the file itself. */
export function LogList({ fixtureId }: { fixtureId: number }) {
  const logs = useQuery(logsQuery(fixtureId));
  const [refused, setRefused] = useState<Log | null>(null);
  if (logs.isPending) return <Loading />;
  if (logs.isError) return <ErrorState error={logs.error} retry={() => void logs.refetch()} />;
  if (logs.data.items.length === 0) {
    return <EmptyState title="No log yet">Trials come from logs: upload the first one.</EmptyState>;
  }
  return (
    <>
      <DataTable
        caption="Trial logs, newest first"
        rows={logs.data.items}
        rowKey={({ id }) => id}
        columns={[
          {
            key: 'file',
            title: 'File',
            cell: ({ id, fileName }) => (
              <Link to={`?log=${id}`} className="break-all">
                {fileName}
              </Link>
            ),
          },
          { key: 'at', title: 'Uploaded', cell: ({ createdAt }) => formatMinute(createdAt) },
          { key: 'by', title: 'By', cell: ({ createdBy }) => createdBy },
          { key: 'accepted', title: 'Stored', numeric: true, cell: ({ accepted }) => accepted },
          {
            key: 'refused',
            title: 'Refused',
            numeric: true,
            cell: (log) =>
              log.refused === 0 ? (
                0
              ) : (
                <button
                  type="button"
                  className="cursor-pointer rounded px-1.5 py-0.5 font-bold text-accent hover:underline"
                  aria-label={`Show the ${log.refused} refused rows of ${log.fileName}`}
                  onClick={() => setRefused(log)}
                >
                  {log.refused}, show
                </button>
              ),
          },
          {
            key: 'raw',
            title: 'As uploaded',
            cell: ({ id, fileName }) => (
              <a
                href={`/api/logs/${id}/raw`}
                download={fileName}
                aria-label={`Download ${fileName}`}
              >
                Download
              </a>
            ),
          },
        ]}
      />
      {refused !== null && <RefusedDialog log={refused} close={() => setRefused(null)} />}
    </>
  );
}
