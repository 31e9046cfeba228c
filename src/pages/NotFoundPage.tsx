import { useTitle } from '../lib/useTitle.ts';
import { ButtonLink } from '../ui/ButtonLink.tsx';
import { EmptyState } from '../ui/EmptyState.tsx';
import { PageHeader } from '../ui/PageHeader.tsx';

export function NotFoundPage() {
  useTitle('Not found');
  return (
    <>
      <PageHeader title="There is no such page" />
      <EmptyState title="The address leads nowhere.">
        <p className="mb-4">It may have been mistyped, or the link is old.</p>
        <ButtonLink to="/fixtures">All fixtures</ButtonLink>
      </EmptyState>
    </>
  );
}
