/** An answer takes its place: it replaces what it had seen. */
import { isProving } from '../known/proving';
import { before } from '../order/placed';
import { withNewest, withOwnNewest } from './frontier';
import { refresh } from './left';
import { addTo, type Answered, type View } from './view';

/** A dead reading over its limit warns whatever its gate; only a good one that had seen it ends the warning. */
function noteDanger(view: View, answer: Answered): void {
  const asked = view.setting.lookup.steps[answer.step];
  if (asked?.ask.kind !== 'reading' || !asked.ask.dead || answer.value.kind !== 'reading') return;
  const known = view.dangers.get(answer.step) ?? [];
  const isOver = Math.abs(answer.value.value) > (asked.ask.high ?? 0);
  const stays =
    answer.verdict === 'ok' ? known.filter(({ placed }) => !before(placed, answer.placed)) : known;
  const dangers = isOver ? [...stays, answer] : stays;
  if (dangers.length > 0) view.dangers.set(answer.step, dangers);
  else view.dangers.delete(answer.step);
}

export function applyAnswer(view: View, answer: Answered): void {
  const { step, verdict } = answer;
  const asked = view.setting.lookup.steps[step];
  if (!asked) return;
  noteDanger(view, answer);
  // Plain answers are most of a job; only those on which a proof may hang make it stale.
  if ((isProving(asked) && !asked.personal) || asked.ask.kind === 'instrument') view.proofVersion += 1;
  if (verdict === 'refused') return;
  view.started = true;
  if (asked.family === 'tester-proved' && verdict === 'out') addTo(view.failures, step, answer);
  const keep = asked.by === 'each' ? withOwnNewest : withNewest;
  view.answers[step] = keep(view.answers[step], answer);
  if (asked.personal) view.own[step] = withOwnNewest(view.own[step], answer);
  refresh(view, step);
}
