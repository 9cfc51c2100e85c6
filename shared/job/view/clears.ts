/** Who is clear: they said so, or a foreman for one who never locked on, after everything they did in the panel. */
import { before, isKnownTo } from '../order/placed';
import { isInRound } from './rounds';
import type { View } from './view';

/** Concurrent work makes a clear worthless: it had not heard of it. */
export function isClear(view: View, person: string): boolean {
  const work = view.work.get(person) ?? [];
  return (view.clears.get(person) ?? []).some(
    (clear) =>
      isInRound(view, clear) &&
      work.every((each) => before(each, clear)) &&
      (clear.person === person ||
        !view.locks.some((lock) => lock.person === person && isKnownTo(lock.on, clear))),
  );
}
