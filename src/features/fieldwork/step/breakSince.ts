/** How long this person has been away from a job, judged by their own newest entry on it. */
import type { Entry } from '../../../../shared/job/entry';
import type { JobFacts } from '../../../../shared/job/types';

/** checklist.md: interrupted more than 10 minutes shows the last answer and asks for the own lock. */
export const longBreakMs = 10 * 60_000;
/** checklist.md: after 30 minutes the terminals still to be worked are proved dead again. */
export const proveAgainMs = 30 * 60_000;

/** This person's newest entry of a job: highest number in each of their logs, latest clock among those. */
export function newestOwn(entries: Entry[], facts: JobFacts, person: string): Entry | undefined {
  const heads = new Map<string, Entry>();
  for (const entry of entries)
    if (facts.logs[entry.log] === person && entry.seq >= (heads.get(entry.log)?.seq ?? 0))
      heads.set(entry.log, entry);
  return [...heads.values()].sort((a, b) => Date.parse(b.at) - Date.parse(a.at))[0];
}

/** Milliseconds away. A clock that was set back tells nothing: that counts as a long break, not as none. */
export function breakMs(newest: Entry | undefined, now: number): number {
  if (!newest) return 0;
  const away = now - Date.parse(newest.at);
  return away >= 0 ? away : Infinity;
}
