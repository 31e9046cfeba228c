import { Suspense } from 'react';
import { Link, Navigate, NavLink, Outlet, useLocation, useNavigation } from 'react-router';
import { useUser } from '../lib/session.ts';
import { AccountMenu } from '../features/session/AccountMenu.tsx';
import { Loading } from '../ui/Loading.tsx';

const places = [
  { to: '/', text: 'Overview', end: true },
  { to: '/fixtures', text: 'Fixtures', end: false },
];

/** The frame of every page for somebody who is signed in; a visitor is led to sign in first. */
export function AppLayout() {
  return (
    <Suspense fallback={<Loading />}>
      <Frame />
    </Suspense>
  );
}

function Frame() {
  const user = useUser();
  const location = useLocation();
  const waiting = useNavigation().state === 'loading';
  if (user === null) {
    const here = location.pathname + location.search;
    return (
      <Navigate
        to={here === '/' ? '/sign-in' : `/sign-in?next=${encodeURIComponent(here)}`}
        replace
      />
    );
  }
  return (
    <>
      <a
        href="#content"
        className="sr-only focus:not-sr-only focus:absolute focus:z-10 focus:m-2 focus:rounded focus:bg-accent focus:px-3 focus:py-2 focus:text-on-accent"
      >
        Skip to the content
      </a>
      <header className="border-b border-line bg-raised print:hidden">
        <div className="mx-auto flex max-w-[90rem] flex-wrap items-center gap-x-6 px-4">
          <Link to="/" className="py-2.5 text-lg font-bold text-ink no-underline">
            Tautline
          </Link>
          <nav aria-label="Places" className="flex grow">
            {places.map(({ to, text, end }) => (
              <NavLink
                key={to}
                to={to}
                end={end}
                className="border-b-2 border-transparent px-3 py-3 text-ink no-underline hover:bg-hover aria-[current=page]:border-accent aria-[current=page]:font-bold"
              >
                {text}
              </NavLink>
            ))}
          </nav>
          <AccountMenu user={user} />
        </div>
      </header>
      <main
        id="content"
        tabIndex={-1}
        aria-busy={waiting || undefined}
        className="mx-auto max-w-[90rem] px-4 py-6 focus:outline-none"
      >
        <Suspense fallback={<Loading />}>
          <Outlet />
        </Suspense>
      </main>
    </>
  );
}
