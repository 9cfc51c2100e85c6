/** Reads a log's entries from where they are: the unsent ones, or the whole log across both databases. */
import type { Entry } from '../../shared/job/entry';
import type { Databases } from './databases';

const logRange = (log: string, from: number) =>
  IDBKeyRange.bound([log, from], [log, Number.MAX_SAFE_INTEGER]);

/** By `seq`, as the index keeps them. */
export const unsentOfLog = ({ outbox }: Databases, log: string): Promise<Entry[]> =>
  outbox.run((database) => database.getAllFromIndex('entries', 'log', logRange(log, 0)));

/** Own entries from seq `from` on, acknowledged ones too: a server that lost some asks for them again. */
export async function wholeLog({ outbox, work }: Databases, log: string, from: number): Promise<Entry[]> {
  const range = logRange(log, from);
  const kept = await work.run((database) => database.getAllFromIndex('entries', 'log', range));
  const fresh = await outbox.run((database) => database.getAllFromIndex('entries', 'log', range));
  const byId = new Map([...kept.map(({ entry }) => entry), ...fresh].map((entry) => [entry.id, entry]));
  return [...byId.values()].sort((a, b) => a.seq - b.seq);
}

export interface UnsentLog {
  job: string;
  log: string;
  key: string;
}

/** The logs of this device that have unsent entries. */
export async function unsentLogs({ outbox }: Databases): Promise<UnsentLog[]> {
  return outbox.run(async (database) => {
    const heads = await database.getAll('heads');
    const counts = await Promise.all(
      heads.map(({ log }) => database.countFromIndex('entries', 'log', logRange(log, 0))),
    );
    return heads
      .filter((_, index) => (counts[index] ?? 0) > 0)
      .map(({ job, log, key }) => ({ job, log, key }));
  });
}
