/** May this person sign for their own answers? */
import { stageNumber } from '../known/lookup';
import { isSettled } from '../known/passing';
import { knownIn } from '../view/knownIn';
import type { View } from '../view/view';
import type { Refusal } from '../types';
import { finishedChecks, refuseToSign, type SignCheck } from './signFacts';

const notOnJob: SignCheck = ({ known, person }) =>
  known.workers.includes(person) ? undefined : refuseToSign('not-on-job');

/** Nobody signs what they have not read. */
const notRead: SignCheck = ({ known, person }) => {
  const unread = known.lookup.inStage[stageNumber.sign]?.find(
    (step) => !isSettled(known.ownStatus(step, person)),
  );
  const step = unread === undefined ? undefined : known.lookup.steps[unread];
  return step && refuseToSign('not-read', { step: step.title });
};

const nothingToSign: SignCheck = ({ known, person }) =>
  known.unsigned(person).length > 0 ? undefined : refuseToSign('nothing');

export const signChecks: readonly { name: string; check: SignCheck }[] = [
  { name: 'not-on-job', check: notOnJob },
  ...finishedChecks,
  { name: 'not-read', check: notRead },
  { name: 'nothing', check: nothingToSign },
];

export const signRefusals: (facts: Parameters<SignCheck>[0]) => Refusal[] = (facts) =>
  signChecks.flatMap(({ check }) => check(facts) ?? []);

/** Everything that stood against a signature when it was made. */
export const refusalsOfSignature = (view: View, person: string, pack: string): Refusal[] =>
  signRefusals({ known: knownIn(view, pack), person });
