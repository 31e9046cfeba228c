import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router';
import type { Fixture, FixtureInput } from '../../shared/schemas/fixture.ts';
import { FixtureForm } from '../features/fixtures/FixtureForm.tsx';
import { fixtureQuery } from '../features/fixtures/fixtureQueries.ts';
import { api } from '../lib/api.ts';
import { useMay } from '../lib/session.ts';
import { useFixtureId } from '../lib/useFixtureId.ts';
import { useTitle } from '../lib/useTitle.ts';
import { ForbiddenState } from '../ui/ForbiddenState.tsx';
import { PageHeader } from '../ui/PageHeader.tsx';

export function EditFixturePage() {
  const id = useFixtureId();
  const { data: fixture } = useSuspenseQuery(fixtureQuery(id));
  const mayEdit = useMay('editFixtures');
  const navigate = useNavigate();
  const client = useQueryClient();
  useTitle(`Edit ${fixture.code}`);
  if (!mayEdit) return <ForbiddenState what="change fixtures" />;
  return (
    <>
      <PageHeader title={`Edit ${fixture.code}`} />
      <FixtureForm
        initial={inputOf(fixture)}
        submitText="Save changes"
        cancelTo={`/fixtures/${id}`}
        store={async (input) => {
          const body = { version: fixture.version, ...input };
          await api<Fixture>(`/api/fixtures/${id}`, { method: 'PATCH', body });
          await client.invalidateQueries();
          await navigate(`/fixtures/${id}`);
        }}
      />
    </>
  );
}

function inputOf(fixture: Fixture): FixtureInput {
  const { code, name, line, status, remark, axis, move, drive, seat, hold } = fixture;
  return { code, name, line, status, remark, axis, move, drive, seat, hold };
}
