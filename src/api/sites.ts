import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { page } from '../../shared/api/common';
import { siteView, type SiteSettings } from '../../shared/api/sites';
import { request } from './request';

const sitesPage = page(siteView);

export const useSites = () =>
  useQuery({ queryKey: ['sites'], queryFn: ({ signal }) => request(sitesPage, '/api/sites', { signal }) });

interface SiteBody {
  id: string;
  name: string;
  settings: SiteSettings;
}

export function useCreateSite() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SiteBody) => request(z.unknown(), '/api/sites', { method: 'POST', body }),
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: ['sites'] }),
        client.invalidateQueries({ queryKey: ['session'] }),
      ]),
  });
}

export function useChangeSite() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, ...body }: SiteBody & { version: number }) =>
      request(z.unknown(), `/api/sites/${id}`, { method: 'PATCH', body }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['sites'] }),
  });
}
