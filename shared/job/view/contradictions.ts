/** Entries that cannot both be true, each kind by its own small check. */
import { say } from '../../panel/says';
import type { JobState } from '../types';
import { isClosedUnder, locksOn } from './locks';
import type { View } from './view';

export type Contradiction = JobState['contradictions'][number];

const nameOf = (view: View, person: string): string =>
  view.setting.facts.people.find(({ id }) => id === person)?.name ?? '?';

/** An isolator was closed while a lock was, or may have been, on it. */
const closedUnderLock = (view: View, isSettled: boolean): Contradiction[] =>
  view.closings.flatMap((closing) =>
    view.locks
      .filter((lock) => isClosedUnder(lock, closing) && lock.offs.length > 0 === isSettled)
      .map((lock) => ({
        code: 'closed-under-lock',
        entries: [lock.on.entry.id, closing.placed.entry.id],
        says: say('job.contradiction.closed-under-lock', {
          isolator: lock.isolator,
          lock: lock.lock,
          name: nameOf(view, lock.person),
        }),
      })),
  );

/** One padlock cannot hang in two places, nor belong to two people. */
function lockTwice(view: View): Contradiction[] {
  const on = locksOn(view);
  return on.flatMap((lock, index) =>
    on
      .slice(index + 1)
      .filter(
        (other) =>
          other.lock === lock.lock && (other.isolator !== lock.isolator || other.person !== lock.person),
      )
      .map((other) => ({
        code: 'lock-twice',
        entries: [lock.on.entry.id, other.on.entry.id],
        says: say('job.contradiction.lock-twice', {
          lock: lock.lock,
          isolator: lock.isolator,
          other: other.isolator,
        }),
      })),
  );
}

/** What shuts wiring and closing now. */
export const contradictionsOf = (view: View): Contradiction[] => [
  ...closedUnderLock(view, false),
  ...lockTwice(view),
];

/** What was one until the lock came off: kept for the record. */
export const settledContradictions = (view: View): Contradiction[] => closedUnderLock(view, true);
