import { useInfiniteQuery, useMutation, useQuery } from '@tanstack/react-query';
import type { z } from 'zod';
import { page } from '../../shared/api/common';
import { recordView } from '../../shared/api/recordDocument';
import { recordRow, verifyAnswer, type VerifyAnswer, type verifyRequest } from '../../shared/api/records';
import { nextPage } from './nextPage';
import { request } from './request';

const recordsPage = page(recordRow);

/** Records of a site; `filter` is the query string of the page's own address. */
export const useRecords = (site: string | undefined, filter: string) =>
  useInfiniteQuery({
    queryKey: ['records', site, filter],
    queryFn: ({ pageParam, signal }) =>
      request(recordsPage, `/api/records?limit=50&site=${site}${filter && `&${filter}`}${pageParam}`, {
        signal,
      }),
    enabled: site !== undefined,
    ...nextPage,
  });

type ToVerify = z.infer<typeof verifyRequest> | { pdf: string; printed: string | undefined };

const ask = (body: z.infer<typeof verifyRequest>) =>
  request(verifyAnswer, '/api/verify', { method: 'POST', body, timeoutMs: 60_000 });

/**
 * A PDF is asked for by its own hash first. Only when no site made exactly this file, the record it names is
 * looked up, and the answer says that the file itself differs: a changed page could still carry a good digest.
 */
async function verify(what: ToVerify): Promise<{ answer: VerifyAnswer; changedPdf: boolean }> {
  if (!('pdf' in what)) return { answer: await ask(what), changedPdf: false };
  const answer = await ask({ digest: what.pdf });
  if (answer.known || what.printed === undefined) return { answer, changedPdf: false };
  return { answer: await ask({ digest: what.printed }), changedPdf: true };
}

export const useVerify = () => useMutation({ mutationFn: verify });

export const useRecord = (record: string) =>
  useQuery({
    queryKey: ['record', record],
    queryFn: ({ signal }) => request(recordView, `/api/records/${record}`, { signal, timeoutMs: 60_000 }),
  });
