import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiError } from './api.ts';
import { sessionQuery } from './session.ts';

/** Somebody whose session has ended is nobody: the layout then leads to the sign-in page. */
function noticeSignedOut(error: Error): void {
  if (error instanceof ApiError && error.status === 401) {
    void queryClient.invalidateQueries({ queryKey: sessionQuery.queryKey });
  }
}

export const queryClient: QueryClient = new QueryClient({
  queryCache: new QueryCache({ onError: noticeSignedOut }),
  mutationCache: new MutationCache({ onError: noticeSignedOut }),
  defaultOptions: {
    queries: {
      staleTime: 10_000,
      // What the server refused it will refuse again; what did not arrive may.
      retry: (count, error) =>
        count < 2 && error instanceof ApiError && (error.status === 0 || error.status === 503),
    },
    mutations: { retry: false },
  },
});
