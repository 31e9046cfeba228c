import { queryOptions, useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { may, type Permission } from '../../shared/access/permissions.ts';
import type { Session, SessionUser, SignIn } from '../../shared/schemas/session.ts';
import { api, setCsrfToken } from './api.ts';

export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: async ({ signal }) => keepToken(await api<Session>('/api/session', { signal })),
  staleTime: 60_000,
});

function keepToken(session: Session): Session {
  setCsrfToken(session.csrfToken);
  return session;
}

/** The signed-in person; null for a visitor. Suspends until it is known. */
export function useUser(): SessionUser | null {
  return useSuspenseQuery(sessionQuery).data.user;
}

/** Whether the signed-in person may do this. The server decides; this only hides what it would refuse. */
export function useMay(permission: Permission): boolean {
  const user = useUser();
  return user !== null && may(user.roles, permission);
}

/** Signing in and out, with everything that the one before had seen forgotten. */
export function useSignIn() {
  const client = useQueryClient();
  return {
    signIn: async (credentials: SignIn): Promise<void> => {
      const session = await api<Session>('/api/session', { method: 'POST', body: credentials });
      client.clear();
      client.setQueryData(sessionQuery.queryKey, keepToken(session));
    },
    signOut: async (): Promise<void> => {
      await api('/api/session', { method: 'DELETE' });
      client.clear();
    },
  };
}
