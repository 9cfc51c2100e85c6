/** One request of the sender; every way it can end is a value, because a field phone meets all of them daily. */
import type { z } from 'zod';
import { problem, type Problem } from '../../shared/api/common';
import type { DeviceEnvironment } from './environment';

export type ServerAnswer<T> =
  | { kind: 'ok'; value: T }
  /** Our server refused, in its own words; `body` is the whole problem. */
  | { kind: 'refused'; problem: Problem; body: unknown; retryAfterMs: number | null }
  /** No usable answer: no network, a timeout, a captive portal's page. Nothing is known about what was done. */
  | { kind: 'unreachable'; retryAfterMs: number | null }
  /** An answer of our server that this version cannot read. */
  | { kind: 'unreadable' };

interface CallOptions {
  method?: 'GET' | 'POST';
  body?: unknown;
}

// Long enough for 1 MB over a poor mobile link, short enough that a dead one is noticed while the person looks.
const timeoutMs = 20_000;

async function gzipped(json: string): Promise<{ body: BodyInit; encoding: Record<string, string> }> {
  if (typeof CompressionStream === 'undefined') return { body: json, encoding: {} };
  const stream = new Blob([json]).stream().pipeThrough(new CompressionStream('gzip'));
  // A whole buffer, not a stream: a request body that is a stream needs HTTP/2 and is sent once only.
  return { body: await new Response(stream).arrayBuffer(), encoding: { 'content-encoding': 'gzip' } };
}

async function initOf(language: string, { method = 'GET', body }: CallOptions): Promise<RequestInit> {
  const common = { method, credentials: 'same-origin', cache: 'no-store' } as const;
  const signal = AbortSignal.timeout(timeoutMs);
  // A refusal is kept as the server says it: in the language of the screen.
  const headers = { accept: 'application/json', 'accept-language': language };
  if (body === undefined) return { ...common, signal, headers };
  const packed = await gzipped(JSON.stringify(body));
  return {
    ...common,
    signal,
    headers: { ...headers, 'content-type': 'application/json', ...packed.encoding },
    body: packed.body,
  };
}

/** Retry-After as seconds or as a date (RFC 9110 §10.2.3), in milliseconds from now. */
export function retryAfterMs(header: string | null, now: number): number | null {
  if (header === null) return null;
  const seconds = /^\d+$/.test(header.trim()) ? Number(header) * 1000 : Date.parse(header) - now;
  return Number.isFinite(seconds) ? Math.max(0, seconds) : null;
}

/** Calls the server once. Never throws for what the network or the server does. */
export async function serverCall<S extends z.ZodType>(
  env: DeviceEnvironment,
  schema: S,
  url: string,
  options: CallOptions = {},
): Promise<ServerAnswer<z.infer<S>>> {
  const init = await initOf(env.language(), options);
  const response = await env.fetch(url, init).catch(() => null);
  if (!response) return { kind: 'unreachable', retryAfterMs: null };
  const wait = retryAfterMs(response.headers.get('retry-after'), env.now());
  const isJson = /\bjson\b/.test(response.headers.get('content-type') ?? '');
  const body: unknown = isJson ? await response.json().catch(() => undefined) : undefined;
  if (body === undefined) return { kind: 'unreachable', retryAfterMs: wait };
  if (response.ok) {
    const parsed = schema.safeParse(body);
    return parsed.success ? { kind: 'ok', value: parsed.data } : { kind: 'unreadable' };
  }
  const said = problem.safeParse(body);
  if (!said.success) return { kind: 'unreachable', retryAfterMs: wait };
  return { kind: 'refused', problem: said.data, body, retryAfterMs: wait };
}
