import { useMay } from '../../lib/session.ts';
import { ButtonLink } from '../../ui/ButtonLink.tsx';
import { EmptyState } from '../../ui/EmptyState.tsx';
import { PageHeader } from '../../ui/PageHeader.tsx';

/** Why there is no boundary yet, and the next step towards one. */
export function NoBoundary({
  fixtureId,
  reason,
  needsBuildUp,
}: {
  fixtureId: number;
  reason: string | null;
  needsBuildUp: boolean;
}) {
  const mayUpload = useMay('uploadLogs');
  const mayEdit = useMay('editFixtures');
  return (
    <>
      <PageHeader title="Boundary" />
      <EmptyState title="There is no boundary yet">
        <p>{reason ?? 'The boundary is drawn from trials, and there are none yet.'}</p>
        <p className="mt-4 flex flex-wrap justify-center gap-2">
          {needsBuildUp && mayEdit && (
            <ButtonLink to={`/fixtures/${fixtureId}/build-up`}>Enter the build-up</ButtonLink>
          )}
          {mayUpload && (
            <ButtonLink look="primary" to={`/fixtures/${fixtureId}/trials/upload`}>
              Upload a trial log
            </ButtonLink>
          )}
        </p>
      </EmptyState>
    </>
  );
}
