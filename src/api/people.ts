import { useInfiniteQuery, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { page, type Role } from '../../shared/api/common';
import { personView, type invitationRequest, type personChange } from '../../shared/api/people';
import { z } from 'zod';
import { nextPage } from './nextPage';
import { request } from './request';

const peoplePage = page(personView);

export const usePeople = (site: string | undefined) =>
  useInfiniteQuery({
    queryKey: ['people', site],
    queryFn: ({ pageParam, signal }) =>
      request(peoplePage, `/api/people?limit=100&site=${site}${pageParam}`, { signal }),
    enabled: site !== undefined,
    ...nextPage,
  });

/** Everybody with a role at a site; the lists to choose from are short, so one page holds them. */
export const usePeopleOfRole = (site: string | undefined, role: Role) =>
  useQuery({
    queryKey: ['people', site, role],
    queryFn: ({ signal }) =>
      request(peoplePage, `/api/people?limit=200&site=${site}&role=${role}`, { signal }),
    enabled: site !== undefined,
  });

export function useInvite() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: z.infer<typeof invitationRequest>) =>
      request(z.unknown(), '/api/invitations', { method: 'POST', body }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['people'] }),
  });
}

export function useChangePerson() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, ...body }: z.infer<typeof personChange> & { id: string }) =>
      request(z.unknown(), `/api/people/${id}`, { method: 'PATCH', body }),
    onSettled: () => client.invalidateQueries({ queryKey: ['people'] }),
  });
}
