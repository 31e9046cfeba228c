import { EventList } from '../features/history/EventList.tsx';
import { useFixtureId } from '../lib/useFixtureId.ts';
import { useTitle } from '../lib/useTitle.ts';
import { PageHeader } from '../ui/PageHeader.tsx';

export function HistoryPage() {
  useTitle('History');
  return (
    <>
      <PageHeader title="History">
        Who did what, when, from which value to which. Nothing here can be changed.
      </PageHeader>
      <EventList fixtureId={useFixtureId()} />
    </>
  );
}
