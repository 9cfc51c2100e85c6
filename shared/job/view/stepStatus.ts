/** What stands on a step in a view: worked out from what counts, never stored. */
import { canonicalJson } from '../../panel/canonical';
import { isProving } from '../known/proving';
import { before } from '../order/placed';
import type { StepStatus } from '../types';
import { countingAnswers } from './countingAnswers';
import { heldStatus } from './holds';
import { isOn, isOffInRound } from './locks';
import type { Answered, View } from './view';

export interface Standing {
  status: StepStatus;
  answer?: Answered;
}

const open: Standing = { status: 'open' };
/** A choice counts when the foreman had seen every answer that stands. */
function chosenOf(view: View, step: number, standing: readonly Answered[]): Answered | undefined {
  const choices = (view.chosen.get(step) ?? []).filter((choice) =>
    standing.every(({ placed }) => before(placed, choice)),
  );
  const last = choices.filter((choice) => !choices.some((other) => before(choice, other)));
  const named = new Set(last.map(({ known }) => known.body.entry));
  return named.size === 1 ? standing.find(({ placed }) => named.has(placed.entry.id)) : undefined;
}

const sameValue = (a: Answered, b: Answered): boolean =>
  a.verdict === b.verdict && canonicalJson(a.value) === canonicalJson(b.value);

const stands = (answer: Answered): Standing => ({
  status: answer.verdict === 'ok' ? 'done' : 'out',
  answer,
});

function standingOf(view: View, step: number, standing: readonly Answered[]): Standing {
  const [first, ...others] = standing;
  if (!first) return open;
  if (others.every((each) => sameValue(first, each))) return stands(first);
  const asked = view.setting.lookup.steps[step];
  const worse = standing.find(({ verdict }) => verdict === 'out');
  if (asked && isProving(asked)) return worse ? stands(worse) : { status: 'two-answers', answer: first };
  const chosen = chosenOf(view, step, standing);
  return chosen ? stands(chosen) : { status: 'two-answers', answer: first };
}

function lockOnStanding(view: View, isolator: string, step: number, person: string): Standing {
  const own = countingAnswers(view, step).findLast((each) => each.person === person);
  if (own) return stands(own);
  // A lock that stayed on from the round before need not be put on again.
  const still = view.locks.find(
    (lock) => lock.isolator === isolator && lock.person === person && lock.counts && isOn(lock),
  );
  const answer = view.answers[step]?.findLast((each) => each.placed.entry.id === still?.on.entry.id);
  return answer ? stands(answer) : open;
}

function lockOffStanding(view: View, isolator: string, step: number, person: string): Standing {
  const own = view.locks.filter((lock) => lock.isolator === isolator && lock.person === person);
  if (own.some(isOn) || !own.some((lock) => isOffInRound(view, lock))) return open;
  const answer = countingAnswers(view, step).findLast((each) => each.person === person);
  return answer ? stands(answer) : { status: 'done' };
}

function answeredStanding(view: View, step: number, person: string): Standing {
  const asked = view.setting.lookup.steps[step];
  if (asked?.by !== 'each') return standingOf(view, step, countingAnswers(view, step));
  if (asked.ask.kind === 'lock-on') return lockOnStanding(view, asked.ask.isolator, step, person);
  if (asked.ask.kind === 'lock-off') return lockOffStanding(view, asked.ask.isolator, step, person);
  return standingOf(
    view,
    step,
    countingAnswers(view, step).filter((each) => each.person === person),
  );
}

/** For an `each` step the person's own; for a `one` step the crew's. */
export function ownStanding(view: View, step: number, person: string): Standing {
  const answered = answeredStanding(view, step, person);
  const held = heldStatus(view, step, person, answered.answer?.placed, answered.status);
  return held ? { ...answered, status: held } : answered;
}
