/** What the field screens ask the job engine, in one place: next step, gates, signing. */
import type { Language } from '../../../../shared/api/common';
import type { Step } from '../../../../shared/checklist/types';
import { canCountersign } from '../../../../shared/job/canCountersign';
import { canSign } from '../../../../shared/job/canSign';
import { gateFor } from '../../../../shared/job/gates';
import { nextStep } from '../../../../shared/job/next';
import { signatureDigest } from '../../../../shared/job/signatureDigest';
import type { Gate, Refusal } from '../../../../shared/job/types';
import type { LocalJob } from '../../../offline/types';
import { folded } from './folded';

/** The next step that waits for this person, by what this phone holds. */
export const nextFor = (local: LocalJob, person: string): Step | undefined =>
  nextStep(local.pack.checklist, folded(local), person);

/** May this person answer this step now? */
export const stepGate = (local: LocalJob, person: string, step: string): Gate =>
  gateFor(local.pack.checklist, folded(local), person, step);

export type SignGate = { open: true; steps: string[] } | { open: false; refusals: Refusal[] };

/** May this person sign, and for which steps? */
export const signGate = (local: LocalJob, person: string): SignGate =>
  canSign(local.pack.checklist, folded(local), person);

/** May this person countersign? */
export const countersignGate = (local: LocalJob, person: string): Gate =>
  canCountersign(local.pack.checklist, folded(local), person);

/** The digest that a signature in this language covers. */
export const digestToSign = (local: LocalJob, language: Language): string =>
  signatureDigest({ pack: local.pack, state: folded(local), language });
