/** The one way the client speaks with the server: JSON in, parsed JSON out, problems as a typed error. */
import type { z } from 'zod';
import { problem, type Problem } from '../../shared/api/common';

/** The server answered with a problem (RFC 9457). */
export class ProblemError extends Error {
  constructor(readonly problem: Problem) {
    super(problem.detail ?? problem.title);
  }
}
/** No answer came: no network, a captive portal, a timeout. Nothing is known about what the server did. */
export class UnreachableError extends Error {}

interface RequestOptions {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  body?: unknown;
  signal?: AbortSignal;
  timeoutMs?: number;
  /** Another network than the page's own, for tests and the simulation. */
  fetch?: typeof fetch;
}

/** The sender also runs where there is no document (a worker, a test). */
const screenLanguage = (): string =>
  typeof document === 'undefined' ? 'en' : document.documentElement.lang || 'en';

async function problemOf(response: Response): Promise<Problem> {
  const parsed = problem.safeParse(await response.json().catch(() => null));
  return parsed.success
    ? parsed.data
    : { type: 'about:blank', title: response.statusText, status: response.status, code: 'not-json' };
}

/**
 * Calls the API and parses its answer with the schema of the contract.
 * @throws ProblemError when the server refused, UnreachableError when no usable answer came.
 */
export async function request<S extends z.ZodType>(
  schema: S,
  url: string,
  { method = 'GET', body, signal, timeoutMs = 15_000, fetch: call = fetch }: RequestOptions = {},
): Promise<z.infer<S>> {
  const timeout = AbortSignal.timeout(timeoutMs);
  const init: RequestInit = {
    method,
    credentials: 'same-origin',
    signal: signal ? AbortSignal.any([signal, timeout]) : timeout,
    headers: {
      accept: 'application/json',
      // Findings and problems come back as sentences: in the language of the screen.
      'accept-language': screenLanguage(),
      ...(body === undefined ? {} : { 'content-type': 'application/json' }),
    },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
  };
  const response = await call(url, init).catch((cause: unknown) => {
    throw new UnreachableError('no answer from the server', { cause });
  });
  if (!response.ok) throw new ProblemError(await problemOf(response));
  const json: unknown = response.status === 204 ? undefined : await response.json().catch(() => undefined);
  const parsed = schema.safeParse(json);
  // A captive portal answers 200 with its own page: that is no answer from our server.
  if (!parsed.success)
    throw new UnreachableError('the answer is not one this version understands', { cause: parsed.error });
  return parsed.data;
}
