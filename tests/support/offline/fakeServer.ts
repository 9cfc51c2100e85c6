/** A small server of entries that keeps the rules of the wire, and misbehaves on request. */
import { gunzipSync } from 'node:zlib';
import { entriesRequest, keyRequest, type Pack } from '../../../shared/api/jobs';
import type { Entry } from '../../../shared/job/entry';
import { entryHash } from '../../../shared/job/entryBytes';

interface Held {
  entry: Entry;
  order: number;
}
type Reply = { status: number; body: unknown; headers?: Record<string, string> };

const problem = (status: number, code: string, more: object = {}): Reply => ({
  status,
  body: { type: `urn:coldloop:problem:${code}`, title: code, status, code, ...more },
});

export class FakeServer {
  readonly held: Held[] = [];
  readonly keys = new Map<string, { person: string; publicKey: unknown }>();
  readonly requests: { method: string; path: string }[] = [];
  packs: Pack[] = [];
  status = 'sent';
  /** Who is signed in; null: everything but delivery is refused with 401. */
  session: string | null = null;
  /** Entry ids refused with 422, and those set aside. */
  refused = new Set<string>();
  aside = new Set<string>();
  /** Called before a request is looked at; what it answers is sent instead. 'cut': no answer and nothing done. */
  meddle: (method: string, path: string) => Reply | 'cut' | undefined = () => undefined;
  /** Does the work of the next pushes, then loses the reply. */
  loseReplies = 0;

  /** Entries it has of one log, by seq. */
  ofLog(log: string): Entry[] {
    return this.held.map(({ entry }) => entry).filter((entry) => entry.log === log);
  }

  fetch: typeof fetch = async (input, init) => {
    const method = init?.method ?? 'GET';
    const url = new URL(input instanceof Request ? input.url : input, 'https://fake.test');
    this.requests.push({ method, path: url.pathname });
    await Promise.resolve();
    const meddled = this.meddle(method, url.pathname);
    if (meddled === 'cut') throw new TypeError('network cut');
    const reply = meddled ?? this.answer(method, url, this.bodyOf(init));
    if (method === 'POST' && this.loseReplies > 0) {
      this.loseReplies -= 1;
      throw new TypeError('reply lost');
    }
    const type = reply.status < 400 ? 'application/json' : 'application/problem+json';
    return new Response(JSON.stringify(reply.body), {
      status: reply.status,
      headers: { 'content-type': type, ...reply.headers },
    });
  };

  private bodyOf(init: RequestInit | undefined): unknown {
    if (init?.body === undefined || init.body === null) return undefined;
    if (typeof init.body === 'string') return JSON.parse(init.body);
    return JSON.parse(gunzipSync(Buffer.from(init.body as ArrayBuffer)).toString());
  }

  private answer(method: string, url: URL, body: unknown): Reply {
    const { pathname } = url;
    if (method === 'POST' && pathname.endsWith('/entries')) return this.push(body);
    if (this.session === null) return problem(401, 'unauthenticated');
    if (pathname === '/api/session') return { status: 200, body: { person: { id: this.session } } };
    if (pathname === '/api/devices') return { status: 201, body };
    if (pathname === '/api/devices/keys') return this.register(body);
    if (pathname === '/api/my/packs') return this.list(url);
    if (pathname.endsWith('/entries')) return this.pull(url);
    return problem(404, 'not-found');
  }

  private register(body: unknown): Reply {
    const { id, publicKey } = keyRequest.parse(body);
    this.keys.set(id, { person: this.session ?? '', publicKey });
    return { status: 201, body: { id } };
  }

  private list(url: URL): Reply {
    const have = (url.searchParams.get('have') ?? '').split(',');
    const current = this.packs.map(({ job, digest }) => ({ job: job.id, digest, status: this.status }));
    return {
      status: 200,
      body: { packs: this.packs.filter(({ digest }) => !have.includes(digest)), current },
    };
  }

  private push(body: unknown): Reply {
    const { entries } = entriesRequest.parse(body);
    const isRefused = entries.find(({ id }) => this.refused.has(id));
    if (isRefused) return problem(422, 'refused', { detail: `no: ${isRefused.id}` });
    const logs = new Map<string, Entry[]>();
    for (const entry of entries) logs.set(entry.log, [...(logs.get(entry.log) ?? []), entry]);
    const heads: Record<string, number> = {};
    for (const [log, sent] of logs) {
      const known = new Set([...this.ofLog(log), ...sent].map(entryHash));
      if (sent.some(({ previous }) => previous !== null && !known.has(previous)))
        heads[log] = this.ofLog(log).at(-1)?.seq ?? 0;
    }
    if (Object.keys(heads).length > 0) return problem(409, 'heads', { heads });
    return { status: 200, body: { acknowledged: entries.map((entry) => this.take(entry)) } };
  }

  private take(entry: Entry) {
    const { id } = entry;
    if (this.aside.has(id)) return { id, order: null, setAside: true };
    const known = this.held.find((each) => each.entry.id === id);
    if (known) return { id, order: known.order, setAside: false };
    const order = this.held.length + 1;
    this.held.push({ entry, order });
    return { id, order, setAside: false };
  }

  private pull(url: URL): Reply {
    const job = url.pathname.split('/')[3];
    const after = Number(url.searchParams.get('after') ?? 0);
    const pageSize = 3;
    const newer = this.held.filter(({ entry, order }) => entry.job === job && order > after);
    const page = newer.slice(0, pageSize);
    const entries = page.map(({ entry, order }) => ({
      ...entry,
      order,
      receivedAt: '2026-12-01T09:00:00Z',
    }));
    return {
      status: 200,
      body: {
        entries,
        logs: [],
        after: page.at(-1)?.order ?? after,
        more: newer.length > pageSize,
        status: this.status,
      },
    };
  }
}
