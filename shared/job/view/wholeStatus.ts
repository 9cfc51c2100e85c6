/** What stands on a step for the whole job, where each answers alone. */
import { before } from '../order/placed';
import type { StepStatus } from '../types';
import { decisionOf } from './holds';
import { isOffInRound, isOn } from './locks';
import { ownStanding } from './stepStatus';
import { countingAnswers } from './countingAnswers';
import type { View } from './view';

/** Everybody who answered or held the step. */
export function answerersOf(view: View, step: number): string[] {
  const people = new Set([
    ...countingAnswers(view, step).map(({ person }) => person),
    ...(view.holds.get(step) ?? []).map(({ placed }) => placed.person),
  ]);
  return [...people].sort();
}

function lockOffWhole(view: View, isolator: string, step: number): StepStatus {
  if ((view.holds.get(step) ?? []).some((held) => !decisionOf(view, held))) return 'held';
  const here = view.locks.filter((lock) => lock.isolator === isolator);
  if (here.some(isOn)) return 'open';
  return here.some((lock) => isOffInRound(view, lock)) ? 'done' : 'open';
}

/** A bad answer of one person stands until somebody who had seen it answers well. */
function isOutdone(view: View, step: number, person: string): boolean {
  const answers = countingAnswers(view, step);
  return answers
    .filter((each) => each.person === person && each.verdict === 'out')
    .every((bad) => answers.some(({ verdict, placed }) => verdict === 'ok' && before(bad.placed, placed)));
}

const worstFirst: readonly StepStatus[] = ['held', 'two-answers', 'out'];

function eachWhole(view: View, step: number): StepStatus {
  const all = answerersOf(view, step).map((person) => ({
    person,
    status: ownStanding(view, step, person).status,
  }));
  const statuses = all
    .filter(({ person, status }) => status !== 'out' || !isOutdone(view, step, person))
    .map(({ status }) => status);
  const worst = worstFirst.find((status) => statuses.includes(status));
  return worst ?? statuses.find((status) => status !== 'open') ?? 'open';
}

/** A step that each answers alone is done for the job when somebody did it and nobody's answer stands against it. */
export function wholeStatus(view: View, step: number): StepStatus {
  const asked = view.setting.lookup.steps[step];
  if (asked?.by !== 'each') return ownStanding(view, step, '').status;
  return asked.ask.kind === 'lock-off' ? lockOffWhole(view, asked.ask.isolator, step) : eachWhole(view, step);
}
