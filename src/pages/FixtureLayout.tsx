import { useQuery } from '@tanstack/react-query';
import { Suspense } from 'react';
import { Link, Outlet } from 'react-router';
import { fixtureQuery } from '../features/fixtures/fixtureQueries.ts';
import { useFixtureId } from '../lib/useFixtureId.ts';
import { ErrorState } from '../ui/ErrorState.tsx';
import { Loading } from '../ui/Loading.tsx';
import { SubNav } from '../ui/SubNav.tsx';

const places = [
  { path: '', text: 'Summary', end: true },
  { path: '/build-up', text: 'Build-up' },
  { path: '/grip', text: 'Grip' },
  { path: '/trials', text: 'Trials' },
  { path: '/boundary', text: 'Boundary' },
  { path: '/history', text: 'History' },
];

/** A fixture's name and its places; each place is a page of its own. */
export function FixtureLayout() {
  const id = useFixtureId();
  const { data: fixture, error, refetch } = useQuery(fixtureQuery(id));
  if (error !== null) return <ErrorState page error={error} retry={() => void refetch()} />;
  if (fixture === undefined) return <Loading />;
  return (
    <>
      <p className="mb-1 text-muted">
        <Link to="/fixtures">Fixtures</Link> / <span className="text-ink">{fixture.code}</span>{' '}
        {fixture.name} · {fixture.line}
      </p>
      <SubNav
        label={`Places of ${fixture.code}`}
        items={places.map(({ path, ...rest }) => ({ to: `/fixtures/${id}${path}`, ...rest }))}
      />
      <Suspense fallback={<Loading />}>
        <Outlet />
      </Suspense>
    </>
  );
}
