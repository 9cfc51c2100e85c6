/** Puts a job together from both databases: its pack, everything held of it, and who owns which log. */
import type { Pack } from '../../shared/api/jobs';
import type { Entry } from '../../shared/job/entry';
import { logId } from '../../shared/job/logId';
import type { JobFacts } from '../../shared/job/types';
import type { Databases } from './databases';
import type { DeviceKey } from './outboxDatabase';
import type { LocalJob } from './types';
import type { WorkLog } from './workDatabase';

function facts(pack: Pack, status: string, logs: WorkLog[], keys: DeviceKey[]): JobFacts {
  const { id } = pack.job;
  const ofPack = pack.people.flatMap((person) =>
    person.keys.map(({ key }) => [logId(id, key), person.id] as const),
  );
  const ofServer = logs.map(({ log, person }) => [log, person] as const);
  const ofDevice = keys.map(({ key, person }) => [logId(id, key), person] as const);
  return {
    people: pack.people.map(({ id: person, name, part }) => ({ id: person, name, part })),
    logs: Object.fromEntries([...ofPack, ...ofServer, ...ofDevice]),
    cancelled: status === 'cancelled',
    pack: pack.digest,
  };
}

/** Outbox first: an entry moved between the two reads is then seen twice, never not at all. */
async function entriesOf({ outbox, work }: Databases, job: string): Promise<Entry[]> {
  const unsent = await outbox.run((database) => database.getAllFromIndex('entries', 'job', job));
  const held = await work.run((database) => database.getAllFromIndex('entries', 'job', job));
  const aside = new Set(held.filter(({ setAside }) => setAside).map(({ id }) => id));
  const folded = held.filter(({ setAside }) => !setAside).map(({ entry }) => entry);
  const byId = new Map([...unsent, ...folded].map((entry) => [entry.id, entry]));
  return [...byId.values()].filter(({ id }) => !aside.has(id));
}

/** Undefined when the job's pack is not on this device. */
export async function localJob(databases: Databases, job: string): Promise<LocalJob | undefined> {
  const { outbox, work } = databases;
  const entries = await entriesOf(databases, job);
  const keys = await outbox.run((database) => database.getAll('keys'));
  return work.run(async (database) => {
    const row = await database.get('jobs', job);
    const pack = row && (await database.get('packs', row.pack));
    if (!row || !pack) return undefined;
    const logs = await database.getAllFromIndex('logs', 'job', job);
    const { status, pulledAt } = row;
    return { pack, status, entries, facts: facts(pack, status, logs, keys), pulledAt };
  });
}

/** The jobs on this device that name this person, soonest due first. */
export async function localJobs(
  { work }: Databases,
  person: string,
  read: (job: string) => Promise<LocalJob | undefined>,
): Promise<LocalJob[]> {
  const ids = await work.run((database) => database.getAllKeys('jobs'));
  const jobs = await Promise.all(ids.map(read));
  return jobs
    .filter((job) => job !== undefined)
    .filter((job) => job.pack.people.some(({ id }) => id === person))
    .sort((a, b) => a.pack.job.due.localeCompare(b.pack.job.due));
}
