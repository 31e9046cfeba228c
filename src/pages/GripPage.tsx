import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { boundaryQuery } from '../features/boundary/boundaryQueries.ts';
import { fixtureQuery } from '../features/fixtures/fixtureQueries.ts';
import { FrictionTestDialog } from '../features/grip/FrictionTestDialog.tsx';
import { FrictionTestTable } from '../features/grip/FrictionTestTable.tsx';
import { GripFigures } from '../features/grip/GripFigures.tsx';
import { gripQuery } from '../features/grip/gripQueries.ts';
import type { FrictionTests } from '../../shared/schemas/frictionTest.ts';
import { useMay } from '../lib/session.ts';
import { useFixtureId } from '../lib/useFixtureId.ts';
import { useTitle } from '../lib/useTitle.ts';
import { Button } from '../ui/Button.tsx';
import { EmptyState } from '../ui/EmptyState.tsx';
import { ErrorState } from '../ui/ErrorState.tsx';
import { Loading } from '../ui/Loading.tsx';
import { PageHeader } from '../ui/PageHeader.tsx';
import { Panel } from '../ui/Panel.tsx';

/** How well the seat grips: friction tests, and the torque they give. */
export function GripPage() {
  const id = useFixtureId();
  useTitle('Grip');
  const mayEdit = useMay('editFixtures');
  const { data: fixture } = useQuery(fixtureQuery(id));
  const { data: tests, error, refetch } = useQuery(gripQuery(id));
  const { data: boundary } = useQuery(boundaryQuery(id));
  const [adding, setAdding] = useState(false);
  if (error !== null) return <ErrorState page error={error} retry={() => void refetch()} />;
  if (fixture === undefined || tests === undefined) return <Loading />;
  return (
    <>
      <PageHeader
        title="Grip"
        actions={
          mayEdit && (
            <Button look="primary" onClick={() => setAdding(true)}>
              Enter a friction test
            </Button>
          )
        }
      >
        {sentenceOf(tests)}
      </PageHeader>
      <div className="space-y-5">
        <Panel title="The seat's friction">
          <GripFigures
            kinetic={tests.kinetic}
            still={tests.static}
            torquePerMu={boundary?.torquePerMu ?? null}
          />
        </Panel>
        {tests.items.length === 0 ? (
          <EmptyState title="No friction test yet.">
            Put the pad on an incline and note height and base where the part just keeps holding
            after a tap.
          </EmptyState>
        ) : (
          <Panel title="Friction tests">
            <FrictionTestTable tests={tests.items} mayEdit={mayEdit} />
          </Panel>
        )}
      </div>
      {adding && (
        <FrictionTestDialog
          fixtureId={id}
          faces={fixture.seat.faces.map(({ name }) => name)}
          close={() => setAdding(false)}
        />
      )}
    </>
  );
}

function sentenceOf({ kinetic, static: still }: FrictionTests): string {
  if (kinetic === null && still === null) {
    return 'Without a friction test theory cannot say where the part lets go.';
  }
  if (kinetic === null) return 'Only static friction is known: theory then has no holding bound.';
  if (still === null)
    return 'Only kinetic friction is known: theory then has one curve, not a band.';
  if (kinetic.mean > still.mean) {
    return 'Kinetic friction came out above static friction: look at how the tests were made.';
  }
  return 'Theory expects a hold below kinetic and a slip above static friction; in between either may happen.';
}
