/** The logs of a job, each as its numbers in order; a number with two entries is a fork. */
import type { Entry } from '../entry';

export interface Log {
  id: string;
  person: string;
  /** Ascending; `entries` has more than one only at and after a fork. */
  levels: { seq: number; entries: Entry[] }[];
  /** First number that two different entries claim. */
  forksAt?: number;
}

/** @param sorted entries by log and number, of people on the job only. */
export function logsOf(sorted: readonly Entry[], personOf: (log: string) => string): Log[] {
  const logs: Log[] = [];
  for (const entry of sorted) {
    let log = logs.at(-1);
    if (log?.id !== entry.log) {
      log = { id: entry.log, person: personOf(entry.log), levels: [] };
      logs.push(log);
    }
    const level = log.levels.at(-1);
    if (level?.seq === entry.seq) {
      level.entries.push(entry);
      log.forksAt ??= entry.seq;
    } else log.levels.push({ seq: entry.seq, entries: [entry] });
  }
  return logs;
}
