import { useQuery } from '@tanstack/react-query';
import { overviewQuery } from '../features/overview/overviewQuery.ts';
import { OverviewCards, OverviewTable } from '../features/overview/OverviewTable.tsx';
import { ParityPicture } from '../features/overview/ParityPicture.tsx';
import { useMay } from '../lib/session.ts';
import { useTitle } from '../lib/useTitle.ts';
import { ButtonLink } from '../ui/ButtonLink.tsx';
import { EmptyState } from '../ui/EmptyState.tsx';
import { ErrorState } from '../ui/ErrorState.tsx';
import { Loading } from '../ui/Loading.tsx';
import { PageHeader } from '../ui/PageHeader.tsx';
import { Panel } from '../ui/Panel.tsx';

/** Which fixtures need somebody, and how theory and trials agree over all of them. */
export function OverviewPage() {
  useTitle('Overview');
  const overview = useQuery(overviewQuery);
  const mayEdit = useMay('editFixtures');
  if (overview.isPending) return <Loading />;
  if (overview.isError) {
    return <ErrorState page error={overview.error} retry={() => void overview.refetch()} />;
  }
  const { sentence, rows, parity } = overview.data;
  if (rows.length === 0) {
    return (
      <>
        <PageHeader title="Overview" />
        <EmptyState title="There is no fixture yet">
          <p>A fixture holds its seat, its build-up, its trials and what follows from them.</p>
          {mayEdit && (
            <p className="mt-4">
              <ButtonLink look="primary" to="/fixtures/new">
                Create the first fixture
              </ButtonLink>
            </p>
          )}
        </EmptyState>
      </>
    );
  }
  return (
    <>
      <PageHeader title="Overview">
        <p>{sentence}</p>
      </PageHeader>
      <div className="grid grid-cols-1 items-start gap-4 xl:grid-cols-[minmax(0,1fr)_28rem]">
        <Panel title="Fixtures">
          <div className="hidden md:block">
            <OverviewTable rows={rows} />
          </div>
          <div className="md:hidden">
            <OverviewCards rows={rows} />
          </div>
        </Panel>
        <Panel title="Theory against trials">
          <ParityPicture points={parity} />
        </Panel>
      </div>
    </>
  );
}
