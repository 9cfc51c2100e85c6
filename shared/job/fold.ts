/** Turns a checklist and any set of entries into the job's state: pure, total, the same for any order of arrival. */
import type { Checklist } from '../checklist/types';
import { holesOf } from './order/holes';
import { inOrder } from './order/inOrder';
import { logsOf } from './order/logs';
import { sortedEntries } from './order/sortedEntries';
import { stateOf } from './state/stateOf';
import type { JobFacts, JobState } from './types';
import { replay } from './view/replay';
import { settingOf } from './view/setting';

/**
 * Entries of people who are not on the job, and what is no entry at all, count for nothing.
 * Each other entry is judged by what it had seen, never by what others had written meanwhile.
 */
export function foldJob(checklist: Checklist, given: readonly unknown[], facts: JobFacts): JobState {
  const { entries, twice } = sortedEntries(given);
  const onJob = new Set(facts.people.map(({ id }) => id));
  const personOf = (log: string) => facts.logs[log] ?? '';
  const counting = entries.filter(({ log }) => onJob.has(personOf(log)));
  const logs = logsOf(counting, personOf);
  const holes = holesOf(entries, counting);
  const replayed = replay(settingOf(checklist, facts, logs, holes), inOrder(logs), logs.length);
  return stateOf({ replayed, scope: checklist.scope, entries, logs, holes, twice });
}
