/** May this person countersign? */
import type { Checklist } from '../checklist/types';
import { knownOf } from './known/knownOf';
import { countersignRefusals } from './sign/countersignChecks';
import { refuseToSign } from './sign/signFacts';
import type { Gate, JobState } from './types';

const already: Partial<Record<JobState['status'], string>> = {
  cancelled: 'cancelled',
  countersigned: 'already-countersigned',
};

export function canCountersign(checklist: Checklist, state: JobState, person: string): Gate {
  const code = already[state.status];
  if (code) return { open: false, refusals: [refuseToSign(code)] };
  const refusals = countersignRefusals({ known: knownOf(checklist, state), person });
  return refusals.length > 0 ? { open: false, refusals } : { open: true };
}
