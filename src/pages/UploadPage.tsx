import { UploadMap } from '../features/boundary/UploadMap.tsx';
import { UploadFlow } from '../features/trials/UploadFlow.tsx';
import { useMay } from '../lib/session.ts';
import { useFixtureId } from '../lib/useFixtureId.ts';
import { useTitle } from '../lib/useTitle.ts';
import { EmptyState } from '../ui/EmptyState.tsx';
import { PageHeader } from '../ui/PageHeader.tsx';

/** Brings a trial log in: what was understood, what was not and why, and what it changes. */
export function UploadPage() {
  const id = useFixtureId();
  useTitle('Upload a trial log');
  const mayUpload = useMay('uploadLogs');
  return (
    <>
      <PageHeader title="Upload a trial log" />
      {mayUpload ? (
        <UploadFlow
          key={id}
          fixtureId={id}
          map={(rows) => <UploadMap fixtureId={id} rows={rows} />}
        />
      ) : (
        <EmptyState title="Logs are uploaded by test engineers and analysts">
          Your role may read the trials, not add to them.
        </EmptyState>
      )}
    </>
  );
}
