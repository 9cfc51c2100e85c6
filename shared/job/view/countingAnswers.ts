/** Which answers of a step count in a view. */
import { isAfterAll } from './frontier';
import { reopenersOf } from './rounds';
import type { Answered, View } from './view';

/** Answers that count now: none that a return, a rework or a round has re-opened. */
export function countingAnswers(view: View, step: number): readonly Answered[] {
  const answers = view.answers[step];
  if (!answers) return [];
  const reopeners = reopenersOf(view, step);
  return reopeners.length === 0 ? answers : answers.filter(({ placed }) => isAfterAll(placed, reopeners));
}
