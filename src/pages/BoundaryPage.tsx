import { useQuery } from '@tanstack/react-query';
import {
  boundaryQuery,
  driveLimitQuery,
  everyTrialQuery,
} from '../features/boundary/boundaryQueries.ts';
import { BoundaryScreen } from '../features/boundary/BoundaryScreen.tsx';
import { NoBoundary } from '../features/boundary/NoBoundary.tsx';
import { useFixtureId } from '../lib/useFixtureId.ts';
import { useTitle } from '../lib/useTitle.ts';
import { ErrorState } from '../ui/ErrorState.tsx';
import { Loading } from '../ui/Loading.tsx';

/** Whether theory and trials agree, configuration by configuration. */
export function BoundaryPage() {
  const id = useFixtureId();
  useTitle('Boundary');
  const boundary = useQuery(boundaryQuery(id));
  const trials = useQuery(everyTrialQuery(id));
  const driveLimit = useQuery(driveLimitQuery(id)).data ?? null;
  const error = boundary.error ?? trials.error;
  if (error !== null) {
    const retry = () => {
      void boundary.refetch();
      void trials.refetch();
    };
    return <ErrorState page error={error} retry={retry} />;
  }
  if (boundary.data === undefined || trials.data === undefined) return <Loading />;
  const { result, reason, buildUpRevision } = boundary.data;
  if (result === null) {
    return <NoBoundary fixtureId={id} reason={reason} needsBuildUp={buildUpRevision === null} />;
  }
  return (
    <BoundaryScreen
      boundary={boundary.data}
      result={result}
      trials={trials.data}
      driveLimit={driveLimit}
    />
  );
}
