/** The rounds of a job, and the one it is in. */
import type { JobState } from '../types';
import { before } from '../order/placed';
import type { View } from '../view/view';

export const roundStates = ({ rounds }: View): JobState['rounds'] =>
  rounds.map(({ placed, reason, words, points }, index) => ({
    id: placed.entry.id,
    number: index + 2,
    reason,
    words,
    person: placed.person,
    at: placed.entry.at,
    points: [...points],
  }));

/** Rounds that were started at once, neither knowing of the other, are walked as one. */
export function presentRound(view: View, scope: readonly string[]): JobState['round'] {
  const { rounds } = view;
  const newest = rounds.filter(({ placed }) => !rounds.some((other) => before(placed, other.placed)));
  const last = rounds.at(-1);
  return last
    ? {
        id: last.placed.entry.id,
        number: rounds.length + 1,
        points: [...new Set(newest.flatMap(({ points }) => points))],
      }
    : { id: '', number: 1, points: [...scope] };
}
