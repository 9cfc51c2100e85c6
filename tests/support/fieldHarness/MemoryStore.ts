/** A device store in the page's own memory (kept over reloads in localStorage), for looking at screens without a device. */
import { v7 } from 'uuid';
import type { Pack } from '../../../shared/api/jobs';
import type { BodyOf, Entry, EntryKind } from '../../../shared/job/entry';
import { entryHash } from '../../../shared/job/entryBytes';
import { say } from '../../../shared/panel/says';
import type { JobFacts } from '../../../shared/job/types';
import {
  NotSavedError,
  type DevicePerson,
  type DeviceStore,
  type LocalJob,
  type PinResult,
  type Readiness,
  type ReadinessCheck,
  type SendState,
} from '../../../src/offline/types';

const key = 'harness.entries';
const checks: ReadinessCheck[] = ['shell', 'pack', 'pin', 'storage', 'self-test'];
/** The PIN of everybody in the harness. */
export const harnessPin = '246810';

export class MemoryStore implements DeviceStore {
  /** Set from the page's console or a test: the next appends fail as a full phone does. */
  failing = false;
  /** Set to the time (ISO) since which no server answers. */
  offlineSince: string | null = null;
  private readonly listeners = new Set<() => void>();
  private readonly mended = new Set<ReadinessCheck>(['shell', 'pack', 'pin', 'storage']);
  private kept: LocalJob;

  constructor(
    private readonly pack: Pack,
    private readonly persons: DevicePerson[],
    entries: Entry[] = [],
  ) {
    const raw = localStorage.getItem(key);
    this.kept = this.jobOf(raw ? (JSON.parse(raw) as Entry[]) : entries);
  }

  private jobOf(entries: Entry[]): LocalJob {
    const { people } = this.pack;
    const facts: JobFacts = {
      people: people.map(({ id, name, part }) => ({ id, name, part })),
      logs: Object.fromEntries(people.map(({ id }) => [this.logOf(id), id])),
    };
    return {
      pack: this.pack,
      status: 'sent',
      entries,
      facts,
      pulledAt: new Date(Date.now() - 41 * 60_000).toISOString(),
    };
  }

  /** A person's log: their own id with another ending, so that it is a uuid and stays the same. */
  private logOf = (person: string): string => `${person.slice(0, -2)}f${person.slice(-1)}`;

  private keep(entries: Entry[]) {
    this.kept = this.jobOf(entries);
    localStorage.setItem(key, JSON.stringify(entries));
    this.listeners.forEach((listener) => {
      listener();
    });
  }

  deviceId = () => Promise.resolve('0190a1b2-0000-7000-8000-0000000000cc');
  jobs = (person: string) =>
    Promise.resolve(this.pack.people.some(({ id }) => id === person) ? [this.kept] : []);
  job = (id: string) => Promise.resolve(id === this.pack.job.id ? this.kept : undefined);

  async append<K extends EntryKind>(person: string, job: string, kind: K, body: BodyOf<K>): Promise<Entry> {
    await Promise.resolve();
    if (this.failing) throw new NotSavedError('quota', 'the harness was told to fail');
    const log = this.logOf(person);
    const own = this.kept.entries.filter((entry) => entry.log === log);
    const seen: Record<string, number> = {};
    for (const entry of this.kept.entries)
      if (entry.log !== log) seen[entry.log] = Math.max(seen[entry.log] ?? 0, entry.seq);
    const last = own.at(-1);
    const entry: Entry = {
      id: v7(),
      job,
      log,
      seq: own.length + 1,
      previous: last ? entryHash(last) : null,
      seen,
      kind,
      body,
      pack: this.pack.digest,
      at: new Date().toISOString(),
      signature: 'A'.repeat(86),
    };
    this.keep([...this.kept.entries, entry]);
    return entry;
  }

  subscribe = (listener: () => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };
  private sent: SendState | undefined;
  sendState = (): SendState => {
    const unsent = this.kept.entries.length;
    // The same object while nothing changed: screens compare by identity.
    if (this.sent?.unsent !== unsent)
      this.sent = {
        unsent,
        oldestUnsentAt: this.kept.entries[0]?.at ?? null,
        state: 'waiting',
        lastSentAt: null,
        lastError: this.offlineSince ? say('app.unreachable') : null,
        needsAttention: [],
      };
    return this.sent;
  };
  watch = () => () => undefined;
  start = () => () => undefined;
  sendNow = () => Promise.resolve();
  people = () => Promise.resolve(this.persons);
  enrol = () => Promise.resolve();
  checkPin = (_person: string, pin: string): Promise<PinResult> =>
    Promise.resolve(pin === harnessPin ? { ok: true } : { ok: false, waitMs: 2000 });
  readiness = (): Promise<Readiness> =>
    Promise.resolve({
      ready: checks.every((check) => this.mended.has(check)),
      checks: checks.map((check) => ({
        check,
        ok: this.mended.has(check),
        says: say('field.job.missingWhy'),
        button: say('field.jobs.look'),
      })),
    });
  fix = (_job: string, check: ReadinessCheck) => {
    this.mended.add(check);
    return Promise.resolve();
  };
  storage = () => Promise.resolve({ persisted: true, usedMB: 1.4, freeMB: 5200 });
  exportUnsent = () => Promise.resolve(JSON.stringify(this.kept.entries));
}
