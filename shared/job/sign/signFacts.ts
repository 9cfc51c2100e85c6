/** What every check before a signature is given. */
import { say, type Text } from '../../panel/says';
import type { Known } from '../known/known';
import type { Refusal } from '../types';

export interface SignFacts {
  known: Known;
  person: string;
}
export type SignCheck = (facts: SignFacts) => Refusal | undefined;

/** A refusal whose words stand under `job.sign.<code>`. */
export const refuseToSign = (code: string, params?: Text['params']): Refusal => ({
  code,
  says: say(`job.sign.${code}`, params),
});

/** What keeps anybody from signing: the job is not finished, or its entries do not agree. */
const unsettled: SignCheck = ({ known }) => {
  const left = known.firstUnsettled();
  const step = left === undefined ? undefined : known.lookup.steps[left];
  return step && refuseToSign('unsettled', { step: step.title });
};

const contradiction: SignCheck = ({ known }) => {
  const [first] = known.contradictions;
  return first && refuseToSign('contradiction', { what: first.says });
};

const unreadable: SignCheck = ({ known }) => (known.unreadable > 0 ? refuseToSign('unreadable') : undefined);

const lockOn: SignCheck = ({ known }) => {
  const [lock] = known.locksOn;
  return (
    lock &&
    refuseToSign('lock-on', { lock: lock.lock, isolator: lock.isolator, name: known.nameOf(lock.person) })
  );
};

export const finishedChecks: readonly { name: string; check: SignCheck }[] = [
  { name: 'unsettled', check: unsettled },
  { name: 'contradiction', check: contradiction },
  { name: 'unreadable', check: unreadable },
  { name: 'lock-on', check: lockOn },
];
