import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { BodiesTable } from '../features/buildUp/BodiesTable.tsx';
import { BuildUpForm } from '../features/buildUp/BuildUpForm.tsx';
import { buildUpsQuery, positionsQuery } from '../features/buildUp/buildUpQueries.ts';
import { InertiaView } from '../features/buildUp/InertiaView.tsx';
import { PositionsPanel } from '../features/buildUp/PositionsPanel.tsx';
import { fixtureQuery } from '../features/fixtures/fixtureQueries.ts';
import { formatQuantity } from '../../shared/units/formatQuantity.ts';
import { formatMinute } from '../lib/formatDate.ts';
import { useMay } from '../lib/session.ts';
import { useFixtureId } from '../lib/useFixtureId.ts';
import { useTitle } from '../lib/useTitle.ts';
import { Button } from '../ui/Button.tsx';
import { EmptyState } from '../ui/EmptyState.tsx';
import { ErrorState } from '../ui/ErrorState.tsx';
import { Loading } from '../ui/Loading.tsx';
import { PageHeader } from '../ui/PageHeader.tsx';
import { Panel } from '../ui/Panel.tsx';

/** What turns with the part, and the inertia that follows at every position. */
export function BuildUpPage() {
  const id = useFixtureId();
  useTitle('Build-up');
  const mayEdit = useMay('editFixtures');
  const { data: fixture } = useQuery(fixtureQuery(id));
  const { data: buildUps, error, refetch } = useQuery(buildUpsQuery(id));
  const { data: positions } = useQuery(positionsQuery(id));
  const [editing, setEditing] = useState(false);
  if (error !== null) return <ErrorState page error={error} retry={() => void refetch()} />;
  if (fixture === undefined || buildUps === undefined || positions === undefined)
    return <Loading />;
  const current = buildUps.items[0] ?? null;
  const form = editing || (current === null && mayEdit);
  return (
    <>
      <PageHeader
        title="Build-up"
        actions={
          mayEdit && !form && <Button onClick={() => setEditing(true)}>Change the build-up</Button>
        }
      >
        {current === null
          ? 'Which bodies turn with the part? Only what would move if it slips, never the table or the drive.'
          : `Revision ${current.revision}: ${current.bodies.length} kinds of bodies, ${formatQuantity(current.totalMass, { digits: 4 })} kg in all.`}
      </PageHeader>
      <div className="space-y-5">
        {form && (
          <Panel title={current === null ? 'Enter the bodies' : 'Change the bodies'}>
            <BuildUpForm
              fixtureId={id}
              version={fixture.version}
              current={current}
              done={() => setEditing(false)}
            />
          </Panel>
        )}
        {!form && current === null && <EmptyState title="The build-up has not been entered yet." />}
        {!form && current !== null && (
          <>
            <Panel title="Moment of inertia">
              <InertiaView
                polynomial={current.polynomial}
                slide={current.slide}
                marks={positions.items}
              />
            </Panel>
            <Panel title="Bodies">
              <BodiesTable bodies={current.bodies} />
            </Panel>
          </>
        )}
        <PositionsPanel fixtureId={id} positions={positions.items} mayEdit={mayEdit} />
        {buildUps.items.length > 0 && (
          <Panel title="Revisions">
            <ul className="space-y-1">
              {buildUps.items.map(({ revision, createdAt, createdBy, remark }) => (
                <li key={revision}>
                  <span className="font-bold">Revision {revision}</span>{' '}
                  <span className="text-muted">
                    {formatMinute(createdAt)}, {createdBy}
                  </span>{' '}
                  {remark}
                </li>
              ))}
            </ul>
          </Panel>
        )}
      </div>
    </>
  );
}
