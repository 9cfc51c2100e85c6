import { useInfiniteQuery, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import type { Language } from '../../shared/api/common';
import {
  findingsAnswer,
  panelCheck,
  panelsPage,
  panelView,
  revisionView,
  type Acceptance,
  revisionRow,
} from '../../shared/api/panels';
import type { Panel } from '../../shared/panel/panelSchema';
import { nextPage } from './nextPage';
import { request } from './request';

// A panel file may hold 40 MB: on a slow line it needs minutes.
const uploadTimeoutMs = 300_000;

export const usePanels = (site: string | undefined) =>
  useInfiniteQuery({
    queryKey: ['panels', site],
    queryFn: ({ pageParam, signal }) =>
      request(panelsPage, `/api/panels?limit=100&site=${site}${pageParam}`, { signal }),
    enabled: site !== undefined,
    ...nextPage,
  });

export const usePanel = (panel: string) =>
  useQuery({
    queryKey: ['panel', panel],
    queryFn: ({ signal }) => request(panelView, `/api/panels/${panel}`, { signal }),
  });

export const useDraftFindings = (panel: string, version: number, language: Language) =>
  useQuery({
    queryKey: ['panel', panel, 'findings', version, language],
    queryFn: ({ signal }) =>
      request(findingsAnswer, `/api/panels/${panel}/draft/findings`, { signal, timeoutMs: 60_000 }),
  });

export const useRevision = (panel: string, revision: number | null) =>
  useQuery({
    queryKey: ['panel', panel, 'revision', revision],
    queryFn: ({ signal }) =>
      request(revisionView, `/api/panels/${panel}/revisions/${revision}`, { signal, timeoutMs: 60_000 }),
    enabled: revision !== null,
    // An issued revision never changes.
    staleTime: Infinity,
  });

export const useRevisionFindings = (panel: string, revision: number, language: Language) =>
  useQuery({
    queryKey: ['panel', panel, 'revision', revision, 'findings', language],
    queryFn: ({ signal }) =>
      request(findingsAnswer, `/api/panels/${panel}/revisions/${revision}/findings`, {
        signal,
        timeoutMs: 60_000,
      }),
  });

/** Lock plan, still-live list, waits and checklist size of a whole panel; `version` names the panel's bytes. */
export const usePanelCheck = (panel: Panel, version: string, language: Language) =>
  useQuery({
    queryKey: ['panel-check', version, language],
    queryFn: ({ signal }) =>
      request(panelCheck, '/api/panel-checks', {
        method: 'POST',
        body: { panel, language },
        signal,
        timeoutMs: 60_000,
      }),
    staleTime: Infinity,
  });

/** The answer of a write is read again from the list or the page: only that it went well matters here. */
const done = z.unknown();

export function useUploadPanel() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { id: string; site: string; panel: Panel }) =>
      request(done, '/api/panels', { method: 'POST', body, timeoutMs: uploadTimeoutMs }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['panels'] }),
  });
}

export function useSaveDraft(panel: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { version: number; panel: Panel }) =>
      request(done, `/api/panels/${panel}/draft`, { method: 'PUT', body, timeoutMs: uploadTimeoutMs }),
    // After a conflict too: the page then shows the draft the other person saved.
    onSettled: () => client.invalidateQueries({ queryKey: ['panel', panel] }),
  });
}

export function useIssueRevision(panel: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { version: number; acceptances: Acceptance[] }) =>
      request(revisionRow, `/api/panels/${panel}/revisions`, { method: 'POST', body, timeoutMs: 60_000 }),
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: ['panel', panel] }),
        client.invalidateQueries({ queryKey: ['panels'] }),
      ]),
  });
}
