/** May this person countersign? A foreman who took no part in the work, when every answer is signed. */
import { knownIn } from '../view/knownIn';
import type { View } from '../view/view';
import type { Refusal } from '../types';
import { finishedChecks, refuseToSign, type SignCheck } from './signFacts';

const notForeman: SignCheck = ({ known, person }) =>
  known.foremen.includes(person) ? undefined : refuseToSign('not-foreman');

const tookPart: SignCheck = ({ known, person }) =>
  known.tookPart(person) ? refuseToSign('took-part') : undefined;

const notSigned: SignCheck = ({ known }) => (known.allSigned() ? undefined : refuseToSign('not-signed'));

export const countersignChecks: readonly { name: string; check: SignCheck }[] = [
  { name: 'not-foreman', check: notForeman },
  { name: 'took-part', check: tookPart },
  ...finishedChecks,
  { name: 'not-signed', check: notSigned },
];

export const countersignRefusals: (facts: Parameters<SignCheck>[0]) => Refusal[] = (facts) =>
  countersignChecks.flatMap(({ check }) => check(facts) ?? []);

/** Everything that stood against a countersignature when it was made. */
export const refusalsOfCountersignature = (view: View, person: string, pack: string): Refusal[] =>
  countersignRefusals({ known: knownIn(view, pack), person });
