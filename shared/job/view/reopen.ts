/** Rounds, returns and rework open steps again. */
import type { Placed } from '../order/placed';
import { refresh } from './left';
import { addTo, type Round, type View } from './view';

export function reopen(view: View, step: number, by: Placed): void {
  addTo(view.reopened, step, by);
  view.proofVersion += 1;
  refresh(view, step);
}

/** After a break the work that is done stays done; only what proves is asked again (isolation.md §3). */
function pointSteps(view: View, { reason, points }: Round): number[] {
  return reason === 'break' ? [] : points.flatMap((point) => view.setting.lookup.ofPoint.get(point) ?? []);
}

export function startRound(view: View, round: Round): void {
  view.rounds.push(round);
  view.proofVersion += 1;
  view.setting.lookup.steps.forEach(({ everyRound }, step) => {
    if (everyRound) refresh(view, step);
  });
  for (const step of new Set(pointSteps(view, round))) reopen(view, step, round.placed);
}
