import { useQuery } from '@tanstack/react-query';
import { Dialog } from '../../ui/Dialog.tsx';
import { ErrorState } from '../../ui/ErrorState.tsx';
import { Loading } from '../../ui/Loading.tsx';
import { RefusedDownload } from './RefusedDownload.tsx';
import { RowProblems } from './RowProblems.tsx';
import { logQuery } from './trialQueries.ts';

/** The rows of a stored log that were refused, with their reasons. */
export function RefusedDialog({
  log,
  close,
}: {
  log: { id: number; fileName: string };
  close: () => void;
}) {
  const { data, error } = useQuery(logQuery(log.id));
  return (
    <Dialog title={`Refused rows of ${log.fileName}`} open onOpenChange={close}>
      {error !== null && <ErrorState error={error} />}
      {error === null && data === undefined && <Loading />}
      {data !== undefined && (
        <div className="space-y-3">
          <RowProblems problems={data.problems} title={`Refused rows of ${log.fileName}`} />
          <RefusedDownload problems={data.problems} fileName={log.fileName} />
        </div>
      )}
    </Dialog>
  );
}
