import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router';
import type { Fixture } from '../../shared/schemas/fixture.ts';
import { FixtureForm } from '../features/fixtures/FixtureForm.tsx';
import { newFixture } from '../features/fixtures/newFixture.ts';
import { api } from '../lib/api.ts';
import { useMay } from '../lib/session.ts';
import { useTitle } from '../lib/useTitle.ts';
import { ForbiddenState } from '../ui/ForbiddenState.tsx';
import { PageHeader } from '../ui/PageHeader.tsx';

export function NewFixturePage() {
  useTitle('New fixture');
  const mayEdit = useMay('editFixtures');
  const navigate = useNavigate();
  const client = useQueryClient();
  if (!mayEdit) return <ForbiddenState what="create fixtures" />;
  return (
    <>
      <PageHeader title="New fixture" />
      <FixtureForm
        initial={newFixture()}
        submitText="Create fixture"
        cancelTo="/fixtures"
        store={async (input) => {
          const { id } = await api<Fixture>('/api/fixtures', { method: 'POST', body: input });
          await client.invalidateQueries();
          await navigate(`/fixtures/${id}/build-up`);
        }}
      />
    </>
  );
}
