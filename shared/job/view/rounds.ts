/** Rounds: what re-opens a step, and which round an entry belongs to. */
import { before, isKnownTo, type Placed } from '../order/placed';
import type { Round, View } from './view';

/** Everything an answer to this step must have seen to count. */
export function reopenersOf(view: View, step: number): readonly Placed[] {
  const single = view.reopened.get(step) ?? [];
  const { steps } = view.setting.lookup;
  if (!steps[step]?.everyRound || view.rounds.length === 0) return single;
  return [...single, ...view.rounds.map(({ placed }) => placed)];
}

export const isInRound = (view: View, placed: Placed): boolean =>
  view.rounds.every((round) => before(round.placed, placed));

/** The newest round an entry had seen; two that were started at once are told apart for showing only. */
export const roundOf = (rounds: readonly Round[], placed: Placed): string =>
  rounds.findLast((round) => isKnownTo(round.placed, placed))?.placed.entry.id ?? '';

/**
 * Locks off has begun, or something was closed, in this round: nothing is worked any more.
 * A closing that the start of the round had not heard of belongs to it.
 */
export const isolationOver = (view: View): boolean =>
  [...view.closings.map(({ placed }): Placed => placed), ...view.restoring].some(
    (placed) => view.rounds.length === 0 || !view.rounds.some((round) => before(placed, round.placed)),
  );
