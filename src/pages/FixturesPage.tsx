import { FixtureList } from '../features/fixtures/FixtureList.tsx';
import { useMay } from '../lib/session.ts';
import { useTitle } from '../lib/useTitle.ts';
import { ButtonLink } from '../ui/ButtonLink.tsx';
import { PageHeader } from '../ui/PageHeader.tsx';

export function FixturesPage() {
  useTitle('Fixtures');
  const mayEdit = useMay('editFixtures');
  return (
    <>
      <PageHeader
        title="Fixtures"
        actions={
          mayEdit && (
            <ButtonLink to="/fixtures/new" look="primary">
              New fixture
            </ButtonLink>
          )
        }
      />
      <FixtureList />
    </>
  );
}
