import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
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

export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { email: string; password: string }) =>
      request(sessionView, '/api/session', { method: 'POST', body }),
    onSuccess: (session) => {
      // Whatever the person before could see goes first.
      client.clear();
      client.setQueryData(sessionQuery.queryKey, session);
    },
  });
}

export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => request(z.unknown(), '/api/session', { method: 'DELETE' }),
    onSuccess: () => {
      client.clear();
      client.setQueryData(sessionQuery.queryKey, null);
    },
  });
}

/** Does this person hold the role anywhere (or at the given site)? */
export const holds = (session: SessionView, role: Role, site?: string): boolean =>
  session.roles.some((held) => held.role === role && (site === undefined || held.site === site));
