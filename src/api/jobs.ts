import { useInfiniteQuery, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import type { Language } from '../../shared/api/common';
import { jobPreview, jobsPage, jobStateView, jobView, type JobRequest } from '../../shared/api/jobs';
import { nextPage } from './nextPage';
import { request } from './request';

/** Boards are read again every 5 seconds while they are on screen. */
const pollMs = 5_000;

export const useJobs = (site: string | undefined) =>
  useInfiniteQuery({
    queryKey: ['jobs', site],
    queryFn: ({ pageParam, signal }) =>
      request(jobsPage, `/api/jobs?limit=200&site=${site}${pageParam}`, { signal }),
    enabled: site !== undefined,
    refetchInterval: pollMs,
    ...nextPage,
  });

export const useJob = (job: string) =>
  useQuery({
    queryKey: ['job', job],
    queryFn: ({ signal }) => request(jobView, `/api/jobs/${job}`, { signal }),
    refetchInterval: pollMs,
  });

interface Choice {
  panel: string;
  revision: number;
  points: string[];
}

/** What a job on these points would be; asked again as the choice changes, the last answer staying on screen meanwhile. */
export const useJobPreview = (choice: Choice | null, language: Language) =>
  useQuery({
    queryKey: ['job-preview', choice, language],
    queryFn: ({ signal }) =>
      request(jobPreview, '/api/jobs/preview', { method: 'POST', body: choice, signal, timeoutMs: 60_000 }),
    enabled: choice !== null && choice.points.length > 0,
    placeholderData: (previous) => previous,
    staleTime: 60_000,
  });

const useJobsChanged = () => {
  const client = useQueryClient();
  return () =>
    Promise.all([
      client.invalidateQueries({ queryKey: ['jobs'] }),
      client.invalidateQueries({ queryKey: ['job'] }),
    ]);
};

export function useCreateJob() {
  const onSuccess = useJobsChanged();
  return useMutation({
    mutationFn: (body: JobRequest) =>
      request(z.unknown(), '/api/jobs', { method: 'POST', body, timeoutMs: 60_000 }),
    onSuccess,
  });
}

export function useSendJob() {
  const onSuccess = useJobsChanged();
  return useMutation({
    mutationFn: (job: string) =>
      request(z.unknown(), `/api/jobs/${job}/send`, { method: 'POST', timeoutMs: 60_000 }),
    onSuccess,
  });
}

export function useCancelJob(job: string) {
  const onSuccess = useJobsChanged();
  return useMutation({
    mutationFn: (words: string) =>
      request(z.unknown(), `/api/jobs/${job}/cancel`, { method: 'POST', body: { words } }),
    onSuccess,
  });
}

/** The steps with their answers, as the server has heard them. */
export const useJobState = (job: string, language: Language) =>
  useQuery({
    queryKey: ['job', job, 'state', language],
    queryFn: ({ signal }) => request(jobStateView, `/api/jobs/${job}/state`, { signal, timeoutMs: 60_000 }),
    refetchInterval: pollMs,
  });
