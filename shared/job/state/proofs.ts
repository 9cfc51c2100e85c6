/** Each electrician's proof as it stands, and what they read dead at single terminals. */
import type { Proof } from '../types';
import { isMeasured, proofOf, sinceOf } from '../view/proof';
import type { View } from '../view/view';

function proofState(view: View, person: string): Proof {
  const { lookup, facts } = view.setting;
  const since = sinceOf(view, person, facts.pack);
  const terminals = [...lookup.terminals.values()]
    .flat()
    .filter((step) => isMeasured(view, step, since))
    .flatMap((step) => lookup.steps[step]?.id ?? []);
  return { ...proofOf(view, person, facts.pack), terminals };
}

export const proofs = (view: View): Record<string, Proof> =>
  Object.fromEntries(view.setting.workers.map((person) => [person, proofState(view, person)]));
