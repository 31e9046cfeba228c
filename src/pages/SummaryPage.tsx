import { useQuery } from '@tanstack/react-query';
import { boundaryQuery } from '../features/boundary/boundaryQueries.ts';
import { ConfigurationTable } from '../features/summary/ConfigurationTable.tsx';
import { FixtureFacts } from '../features/summary/FixtureFacts.tsx';
import { NextStep } from '../features/summary/NextStep.tsx';
import { fixtureQuery } from '../features/fixtures/fixtureQueries.ts';
import { VerdictMark } from '../charts/VerdictMark.tsx';
import { useMay } from '../lib/session.ts';
import { useFixtureId } from '../lib/useFixtureId.ts';
import { useTitle } from '../lib/useTitle.ts';
import { ButtonLink } from '../ui/ButtonLink.tsx';
import { ErrorState } from '../ui/ErrorState.tsx';
import { Loading } from '../ui/Loading.tsx';
import { PageHeader } from '../ui/PageHeader.tsx';
import { Panel } from '../ui/Panel.tsx';

/** A fixture at a glance: the verdict, what it rests on, and the next step. */
export function SummaryPage() {
  const id = useFixtureId();
  const { data: fixture } = useQuery(fixtureQuery(id));
  const { data: boundary, error, refetch } = useQuery(boundaryQuery(id));
  const mayEdit = useMay('editFixtures');
  useTitle(fixture?.code ?? 'Fixture');
  if (error !== null) return <ErrorState page error={error} retry={() => void refetch()} />;
  if (fixture === undefined || boundary === undefined) return <Loading />;
  const { result } = boundary;
  return (
    <>
      <PageHeader
        title={`${fixture.code} ${fixture.name}`}
        actions={mayEdit && <ButtonLink to="edit">Edit</ButtonLink>}
      >
        <VerdictMark verdict={result?.verdict ?? 'not checked'} className="mr-2" />
        {result?.sentence ?? boundary.reason}
      </PageHeader>
      <div className="grid items-start gap-5 xl:grid-cols-[2fr_1fr]">
        <div className="min-w-0 space-y-5">
          <NextStep fixtureId={id} boundary={boundary} />
          <Panel title="Positions">
            <ConfigurationTable boundary={boundary} />
          </Panel>
        </div>
        <Panel title="What was entered">
          <FixtureFacts fixture={fixture} />
        </Panel>
      </div>
    </>
  );
}
