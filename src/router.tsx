import { createBrowserRouter } from 'react-router';
import { AppLayout } from './pages/AppLayout.tsx';
import { PageError } from './pages/PageError.tsx';
import { Loading } from './ui/Loading.tsx';

/** Every address of the client; pages load when they are first opened. */
export const router = createBrowserRouter([
  {
    HydrateFallback: Loading,
    ErrorBoundary: PageError,
    children: [
      {
        path: '/sign-in',
        lazy: { Component: async () => (await import('./pages/SignInPage.tsx')).SignInPage },
      },
      {
        Component: AppLayout,
        children: [
          {
            ErrorBoundary: PageError,
            children: [
              {
                index: true,
                lazy: {
                  Component: async () => (await import('./pages/OverviewPage.tsx')).OverviewPage,
                },
              },
              {
                path: 'fixtures',
                lazy: {
                  Component: async () => (await import('./pages/FixturesPage.tsx')).FixturesPage,
                },
              },
              {
                path: 'fixtures/new',
                lazy: {
                  Component: async () =>
                    (await import('./pages/NewFixturePage.tsx')).NewFixturePage,
                },
              },
              {
                path: 'fixtures/:id',
                lazy: {
                  Component: async () => (await import('./pages/FixtureLayout.tsx')).FixtureLayout,
                },
                children: [
                  {
                    index: true,
                    lazy: {
                      Component: async () => (await import('./pages/SummaryPage.tsx')).SummaryPage,
                    },
                  },
                  {
                    path: 'edit',
                    lazy: {
                      Component: async () =>
                        (await import('./pages/EditFixturePage.tsx')).EditFixturePage,
                    },
                  },
                  {
                    path: 'build-up',
                    lazy: {
                      Component: async () => (await import('./pages/BuildUpPage.tsx')).BuildUpPage,
                    },
                  },
                  {
                    path: 'grip',
                    lazy: {
                      Component: async () => (await import('./pages/GripPage.tsx')).GripPage,
                    },
                  },
                  {
                    path: 'trials',
                    lazy: {
                      Component: async () => (await import('./pages/TrialsPage.tsx')).TrialsPage,
                    },
                  },
                  {
                    path: 'trials/upload',
                    lazy: {
                      Component: async () => (await import('./pages/UploadPage.tsx')).UploadPage,
                    },
                  },
                  {
                    path: 'boundary',
                    lazy: {
                      Component: async () =>
                        (await import('./pages/BoundaryPage.tsx')).BoundaryPage,
                    },
                  },
                  {
                    path: 'history',
                    lazy: {
                      Component: async () => (await import('./pages/HistoryPage.tsx')).HistoryPage,
                    },
                  },
                ],
              },
              {
                path: '*',
                lazy: {
                  Component: async () => (await import('./pages/NotFoundPage.tsx')).NotFoundPage,
                },
              },
            ],
          },
        ],
      },
    ],
  },
]);
