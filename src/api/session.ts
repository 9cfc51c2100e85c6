import { useMutation, useQuery, useQueryClient, type QueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import type { Role } from '../../shared/api/common';
import { sessionView, type SessionView } from '../../shared/api/people';
import { ProblemError, request } from './request';

/** Null: nobody is signed in. Throws UnreachableError when no server answers. */
async function fetchSession(): Promise<SessionView | null> {
  try {
    return await request(sessionView, '/api/session');
  } catch (error) {
    if (error instanceof ProblemError && error.problem.status === 401) return null;
    throw error;
  }
}

export const sessionQuery = { queryKey: ['session'], queryFn: fetchSession, staleTime: 60_000, retry: false };

export const useSession = () => useQuery(sessionQuery);

/** Whatever the person before could see goes; the session's own query stays, since screens are looking at it. */
function becomes(client: QueryClient, session: SessionView | null): void {
  client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== sessionQuery.queryKey[0] });
  client.setQueryData(sessionQuery.queryKey, session);
}

export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { email: string; password: string }) =>
      request(sessionView, '/api/session', { method: 'POST', body }),
    onSuccess: (session) => becomes(client, session),
  });
}

export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => request(z.unknown(), '/api/session', { method: 'DELETE' }),
    onSuccess: () => becomes(client, null),
  });
}

/** Does this person hold the role anywhere (or at the given site)? */
export const holds = (session: SessionView, role: Role, site?: string): boolean =>
  session.roles.some((held) => held.role === role && (site === undefined || held.site === site));
