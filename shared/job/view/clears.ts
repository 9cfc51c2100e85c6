/** Who is clear: they said so, or a foreman for one who never locked on, after everything they did in the panel. */
import { before, isKnownTo, type Placed } from '../order/placed';
import { isInRound } from './rounds';
import type { View } from './view';

/** An entry of theirs that is named and held nowhere may be a lock that went on: a clear must come after it. */
const isSure = ({ setting }: View, person: string, clear: Placed): boolean =>
  setting.unsureUpTo.every(
    (upTo, log) => upTo === 0 || setting.ownerOf[log] !== person || (clear.clock[log] ?? 0) > upTo,
  );

/** Concurrent work makes a clear worthless: it had not heard of it. */
export function isClear(view: View, person: string): boolean {
  const work = view.work.get(person) ?? [];
  return (view.clears.get(person) ?? []).some(
    (clear) =>
      isInRound(view, clear) &&
      isSure(view, person, clear) &&
      work.every((each) => before(each, clear)) &&
      (clear.person === person ||
        !view.locks.some((lock) => lock.person === person && isKnownTo(lock.on, clear))),
  );
}
