/** Takes entries from devices and gives them to devices (sync.md). The signature is the proof, not a session. */
import type { DataSource, EntityManager } from 'typeorm';
import type { z } from 'zod';
import type { EntriesPage, entriesAnswer, entriesRequest } from '../../../shared/api/jobs';
import { logId } from '../../../shared/job/logId';
import type { Actor } from '../../http/actor';
import { Refused } from '../../http/refused';
import type { DevicesService, KnownKey } from '../devices/service';
import type { JobTurns, TakenJob } from '../jobs/turns';
import type { JobBoards } from '../jobs/boards';
import type { PeopleService } from '../people/service';
import { arrivalsOf, refusedAt, type Arrival } from './received';
import { verifyBranches } from './signatures';
import { sortArrivals, type Sorted } from './sorting';
import type { EntryStore, ReceivedEntry } from './store';
import { addEntries, addSetAside, headsOf, readHeld, type NewEntry } from './writes';

type Push = z.output<typeof entriesRequest>;
type Answer = z.output<typeof entriesAnswer>;

export interface EntryParts {
  database: DataSource;
  people: PeopleService;
  devices: DevicesService;
  turns: JobTurns;
  boards: JobBoards;
  store: EntryStore;
  /** Called after a push to a countersigned or sealed job is committed; what is acknowledged stays so, whatever it does. */
  afterEntries: (job: string) => Promise<void>;
}

const pageSize = 500;

export class EntriesService {
  constructor(private readonly parts: EntryParts) {}

  /**
   * Keeps a push whole or not at all. Idempotent: an entry held already is answered with its first order.
   * @throws Refused 409 `heads` when a log lacks what comes before, 422 for what can never be taken.
   */
  async push(job: string, push: Push): Promise<Answer> {
    const keys = await this.keysOf(job, push);
    const arrivals = arrivalsOf(push.entries, (log) => push.logs[log] ?? '');
    await verifyBranches(arrivals, keys);
    const kept = await this.parts.database.transaction((tx) => this.keep(tx, job, arrivals, keys));
    // Asked for a repeated push too: a seal that failed is tried again.
    if (kept.status === 'countersigned' || kept.status === 'sealed') await this.parts.afterEntries(job);
    return { acknowledged: kept.acknowledged };
  }

  /** Each log of the push must follow from this job and a registered key. */
  private async keysOf(job: string, { logs, entries }: Push): Promise<Map<string, KnownKey>> {
    const known = await this.parts.devices.keys(this.parts.database.manager, Object.values(logs));
    const keys = new Map(known.map((each) => [each.key, each]));
    const errors = entries.flatMap((entry, index) => {
      const key = logs[entry.log];
      if (entry.job !== job) return [{ path: `entries.${index}.job`, says: 'is another job' }];
      if (key === undefined || logId(job, key) !== entry.log)
        return [{ path: `entries.${index}.log`, says: 'does not follow from the job and a key in logs' }];
      return keys.has(key) ? [] : [{ path: `logs.${entry.log}`, says: 'names a key that is not registered' }];
    });
    if (errors.length > 0) throw refusedAt('unknown-key', errors);
    return keys;
  }

  private async keep(tx: EntityManager, id: string, arrivals: Arrival[], keys: Map<string, KnownKey>) {
    const job = await this.parts.turns.take(tx, id);
    await this.mustKnowPacks(tx, id, arrivals);
    const { sorted, missing } = sortArrivals(arrivals, await readHeld(tx, arrivals));
    if (missing.size > 0) throw await this.headsWanted(tx, arrivals);
    const at = new Date();
    await addSetAside(tx, id, sorted.aside, at);
    const fresh = await this.numbered(tx, job, sorted.fresh, keys);
    // Another job can take the same id in this moment; sent again, the entry is seen and set aside.
    if ((await addEntries(tx, id, fresh, at)) < fresh.length)
      throw new Refused(503, 'busy', {}, [], { 'retry-after': '1' });
    const status =
      fresh.length > 0 ? await this.parts.turns.heard(tx, id, job.lastOrder + fresh.length, at) : job.status;
    return { acknowledged: acknowledge(arrivals, sorted, fresh), status };
  }

  private async mustKnowPacks(tx: EntityManager, job: string, arrivals: Arrival[]): Promise<void> {
    const named = [...new Set(arrivals.map(({ entry }) => entry.pack))];
    const issued = await this.parts.turns.issuedPacks(tx, job, named);
    const errors = arrivals
      .filter(({ entry }) => !issued.has(entry.pack))
      .map(({ index }) => ({ path: `entries.${index}.pack`, says: 'was never issued for this job' }));
    if (errors.length > 0) throw refusedAt('unknown-pack', errors);
  }

  private async headsWanted(tx: EntityManager, arrivals: Arrival[]): Promise<Refused> {
    const heads = await headsOf(tx, [...new Set(arrivals.map(({ entry }) => entry.log))]);
    return new Refused(409, 'heads', {}, [], {}, { heads });
  }

  /** What comes after its person's access ended is kept as history and marked. */
  private async numbered(
    tx: EntityManager,
    job: TakenJob,
    fresh: Arrival[],
    keys: Map<string, KnownKey>,
  ): Promise<NewEntry[]> {
    const owner = (arrival: Arrival) => keys.get(arrival.key);
    const people = [...new Set(fresh.flatMap((arrival) => owner(arrival)?.person ?? []))];
    const admitted = await this.parts.people.withAccess(tx, people, job.site);
    return fresh.map((arrival, index) => {
      const key = owner(arrival);
      const afterAccess = !key || key.revoked || !admitted.has(key.person);
      return { ...arrival, order: job.lastOrder + index + 1, afterAccess };
    });
  }

  /** Entries after the cursor, for whoever may see the job. */
  async pull(actor: Actor, job: string, after: number): Promise<EntriesPage> {
    const tx = this.parts.database.manager;
    const status = await this.parts.boards.status(actor, job);
    const found = await this.parts.store.after(tx, job, after, pageSize + 1);
    const entries = found.slice(0, pageSize);
    return {
      entries: entries.map(({ entry, order, receivedAt }) => ({
        ...entry,
        order,
        receivedAt: receivedAt.toISOString(),
      })),
      logs: await this.logsOf(tx, entries),
      after: entries.at(-1)?.order ?? after,
      more: found.length > pageSize,
      status,
    };
  }

  private async logsOf(tx: EntityManager, entries: readonly ReceivedEntry[]): Promise<EntriesPage['logs']> {
    const keyOf = new Map(entries.map(({ entry, key }) => [entry.log, key]));
    const keys = await this.parts.devices.keys(tx, [...new Set(keyOf.values())]);
    const known = new Map(keys.map((each) => [each.key, each]));
    return [...keyOf].flatMap(([log, id]) => {
      const key = known.get(id);
      return key ? [{ log, key: id, person: key.person, publicKey: { ...key.publicKey } }] : [];
    });
  }
}

/** One answer an entry of the request, in its order. */
function acknowledge(
  arrivals: readonly Arrival[],
  sorted: Sorted,
  fresh: readonly NewEntry[],
): Answer['acknowledged'] {
  const held = new Map(sorted.acknowledged.map((each) => [each.id, each.order]));
  const orders = new Map(fresh.map(({ hash, order }) => [hash, order]));
  const aside = new Set(sorted.aside.map(({ hash }) => hash));
  return arrivals.map(({ entry: { id }, hash }) => {
    if (aside.has(hash)) return { id, order: null, setAside: true };
    return { id, order: orders.get(hash) ?? held.get(id) ?? null, setAside: false };
  });
}
