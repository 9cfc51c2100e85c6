/** What every view of a job shares: its checklist, its people, and where its logs cannot be trusted. */
import type { Checklist } from '../../checklist/types';
import { lookupOf } from '../known/lookup';
import type { Hole } from '../order/holes';
import type { Log } from '../order/logs';
import type { JobFacts } from '../types';
import type { Setting } from './view';

const withPart = ({ people }: JobFacts, part: 'electrician' | 'foreman'): string[] =>
  [...new Set(people.filter((each) => each.part === part).map(({ id }) => id))].sort();

/** A missing entry may be a lock-off: what its log proved before is not sure any more. A fork is as bad. */
function unsureIn({ id, forksAt = 0 }: Log, holes: readonly Hole[]): number {
  const missing = holes.filter(({ log }) => log === id).map(({ upTo }) => upTo);
  return Math.max(forksAt, ...missing, 0);
}

export function settingOf(
  checklist: Checklist,
  facts: JobFacts,
  logs: readonly Log[],
  holes: readonly Hole[],
): Setting {
  return {
    lookup: lookupOf(checklist),
    facts,
    workers: withPart(facts, 'electrician'),
    foremen: withPart(facts, 'foreman'),
    unsureUpTo: logs.map((log) => unsureIn(log, holes)),
    ownerOf: logs.map(({ person }) => person),
  };
}
