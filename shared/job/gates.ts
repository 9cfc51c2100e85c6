/** May this person answer this step now? */
import type { Checklist } from '../checklist/types';
import { gateRefusals } from './gate/gateChecks';
import { refuse } from './gate/gateFacts';
import { knownOf } from './known/knownOf';
import type { Gate, JobState, Refusal } from './types';

const gateOf = (refusals: Refusal[]): Gate =>
  refusals.length > 0 ? { open: false, refusals } : { open: true };

/** By what this state knows. A step that the checklist does not have is shut. */
export function gateFor(checklist: Checklist, state: JobState, person: string, stepId: string): Gate {
  const known = knownOf(checklist, state);
  const number = known.lookup.numberOf.get(stepId);
  const step = number === undefined ? undefined : known.lookup.steps[number];
  if (number === undefined || !step) return gateOf([refuse('unknown-step')]);
  if (state.status === 'cancelled') return gateOf([refuse('cancelled')]);
  return gateOf(gateRefusals({ known, person, step, number }));
}
