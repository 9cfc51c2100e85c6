/** A person's own newest answers to a step, as a view holds them: several only where they were given side by side. */
import type { Answered, View } from './view';

export function ownNewest(view: View, step: number, person: string): readonly Answered[] {
  const answers = view.own[step] ?? view.answers[step] ?? [];
  return answers.filter((each) => each.person === person);
}
