/** Puts entries the server has into the work database and moves the version vector over what is now whole. */
import type { IDBPTransaction } from 'idb';
import type { Entry } from '../../shared/job/entry';
import type { WorkJob, WorkSchema } from './workDatabase';

export interface HeldEntry {
  entry: Entry;
  setAside: boolean;
}
type KeepTransaction = IDBPTransaction<WorkSchema, ('jobs' | 'entries' | 'logs')[], 'readwrite'>;

async function wholeUpTo(transaction: KeepTransaction, log: string, from: number): Promise<number> {
  const index = transaction.objectStore('entries').index('log');
  let seq = from;
  while ((await index.getKey([log, seq + 1])) !== undefined) seq += 1;
  return seq;
}

/** Idempotent; the server's newest word says what is set aside. Answers the job's row with its vector moved; the caller puts it. */
export async function keepEntries(
  transaction: KeepTransaction,
  row: WorkJob,
  held: HeldEntry[],
): Promise<WorkJob> {
  const store = transaction.objectStore('entries');
  for (const { entry, setAside } of held) {
    const { id, job, log, seq } = entry;
    await store.put({ id, job, log, seq, entry, setAside });
  }
  const vector = { ...row.vector };
  for (const log of new Set(held.map(({ entry }) => entry.log))) {
    const whole = await wholeUpTo(transaction, log, vector[log] ?? 0);
    if (whole > 0) vector[log] = whole;
  }
  return { ...row, vector };
}
