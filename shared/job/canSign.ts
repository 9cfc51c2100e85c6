/** May this person sign, and for which steps? */
import type { Checklist } from '../checklist/types';
import { knownOf } from './known/knownOf';
import { refuseToSign } from './sign/signFacts';
import { signRefusals } from './sign/signChecks';
import type { JobState, Refusal } from './types';

export type SignGate = { open: true; steps: string[] } | { open: false; refusals: Refusal[] };

/** The steps are those whose standing answer is theirs: each signs for their own. */
export function canSign(checklist: Checklist, state: JobState, person: string): SignGate {
  if (state.status === 'cancelled') return { open: false, refusals: [refuseToSign('cancelled')] };
  const known = knownOf(checklist, state);
  const refusals = signRefusals({ known, person });
  if (refusals.length > 0) return { open: false, refusals };
  const steps = checklist.steps.filter(({ id }) =>
    Object.values(state.steps[id]?.by ?? {}).some(({ answer }) => answer?.person === person),
  );
  return { open: true, steps: steps.map(({ id }) => id) };
}
