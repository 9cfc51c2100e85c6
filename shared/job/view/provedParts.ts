/** A reading counts between two proofs of the tester: before it and after it, half an hour apart at most. */
import { before } from '../order/placed';
import type { ProvedPart } from '../known/lookup';
import { ownNewest } from './ownNewest';
import type { Answered, View } from './view';

// isolation.md §3: the same person and instrument, at most 30 minutes a part.
const longestPartMs = 30 * 60_000;

const at = ({ placed }: Answered): number => Date.parse(placed.entry.at);

/** A clock that was set back in between tells nothing about the time: that counts as too long. */
function tookTooLong(first: readonly Answered[], last: readonly Answered[]): boolean {
  return first.some((start) =>
    last.some((end) => {
      if (!before(start.placed, end.placed)) return false;
      const took = at(end) - at(start);
      return !(took >= 0 && took <= longestPartMs);
    }),
  );
}

const areBefore = (earlier: readonly Answered[], later: readonly Answered[]): boolean =>
  earlier.every((one) => later.every((other) => before(one.placed, other.placed)));

function unprovedOf(view: View, person: string, part: ProvedPart): number[] {
  const given = (steps: readonly number[]) => steps.flatMap((step) => ownNewest(view, step, person));
  const [first, read, last] = [given(part.before), given(part.readings), given(part.after)];
  // Only proofs that stand after every reading close the part; until then there is nothing to time.
  if (last.length > 0 && areBefore(read, last) && tookTooLong(first, last))
    return [...part.before, ...part.readings, ...part.after];
  return [
    ...part.readings.filter((step) => !areBefore(first, ownNewest(view, step, person))),
    ...part.after.filter((step) => !areBefore(read, ownNewest(view, step, person))),
  ];
}

/** Steps of Prove dead that this person answered outside a proof of their tester, and must answer again. */
export const unprovedIn = (view: View, person: string): ReadonlySet<number> =>
  new Set(view.setting.lookup.provedParts.flatMap((part) => unprovedOf(view, person, part)));
