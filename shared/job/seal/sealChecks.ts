/** What a job must be before its record is sealed, each as one small named check on its folded state. */
import type { Checklist } from '../../checklist/types';
import { say, type Text } from '../../panel/says';
import { knownOf } from '../known/knownOf';
import { isSettled } from '../known/passing';
import type { JobState, Refusal } from '../types';

export interface SealFacts {
  checklist: Checklist;
  state: JobState;
}

export type SealCode =
  | 'cancelled'
  | 'not-countersigned'
  | 'not-signed'
  | 'same-person'
  | 'step-open'
  | 'hold-undecided'
  | 'contradiction'
  | 'gap'
  | 'unknown-kind'
  | 'lock-on'
  | 'isolator-not-known'
  | 'danger'
  | 'temporary-left';

export interface SealCheck {
  name: SealCode;
  /** What stands against sealing, in values for its words; undefined when nothing does. */
  against: (facts: SealFacts) => Text['params'];
}

const nameOf = (state: JobState, person: string): string =>
  state.people.find(({ id }) => id === person)?.name ?? '?';

const when = (holds: boolean): Text['params'] => (holds ? {} : undefined);
const some = (n: number): Text['params'] => (n > 0 ? { n } : undefined);

function openStep({ checklist, state }: SealFacts): Text['params'] {
  const step = checklist.steps.find(({ id }) => !isSettled(state.steps[id]?.status ?? 'open'));
  return step && { step: step.title };
}

function lockOn({ state }: SealFacts): Text['params'] {
  const lock = state.locks.find(({ offAt }) => offAt === undefined);
  return lock && { lock: lock.lock, isolator: lock.isolator, name: nameOf(state, lock.person) };
}

function samePerson({ state }: SealFacts): Text['params'] {
  const person = state.countersign?.person;
  const isOne = person !== undefined && state.tookPart.includes(person);
  return isOne ? { name: nameOf(state, person) } : undefined;
}

/** A log that somebody has heard of and that is not whole here: whose phone it is, and how far it was heard. */
function gap({ state }: SealFacts): Text['params'] {
  const [first] = state.gaps;
  if (!first) return undefined;
  const more = new Set(state.gaps.map(({ log }) => log)).size - 1;
  return { name: nameOf(state, first.person), seq: first.seq, more };
}

export const sealChecks: readonly SealCheck[] = [
  { name: 'cancelled', against: ({ state }) => when(state.status === 'cancelled') },
  {
    name: 'not-countersigned',
    against: ({ state }) => when(state.status !== 'countersigned' || state.countersign?.stands !== true),
  },
  { name: 'not-signed', against: ({ checklist, state }) => when(!knownOf(checklist, state).allSigned()) },
  { name: 'same-person', against: samePerson },
  { name: 'step-open', against: openStep },
  {
    name: 'hold-undecided',
    against: ({ state }) =>
      some(Object.values(state.steps).filter(({ hold }) => hold && !hold.decided).length),
  },
  {
    name: 'contradiction',
    against: ({ state: { contradictions } }) => contradictions[0] && { what: contradictions[0].says },
  },
  { name: 'gap', against: gap },
  { name: 'unknown-kind', against: ({ state }) => some(state.unknown.length) },
  { name: 'lock-on', against: lockOn },
  {
    name: 'isolator-not-known',
    against: ({ state }) => {
      const isolator = Object.values(state.isolators).find(({ status }) => status === 'not-known');
      return isolator && { isolator: isolator.isolator };
    },
  },
  { name: 'danger', against: ({ state }) => some(state.dangers.length) },
  {
    name: 'temporary-left',
    against: ({ checklist, state }) => some(knownOf(checklist, state).temporariesLeft),
  },
];

/** Everything that stands against sealing; none means that the folded state allows it. */
export const sealRefusals = (facts: SealFacts): (Refusal & { code: SealCode })[] =>
  sealChecks.flatMap(({ name, against }) => {
    const params = against(facts);
    return params ? [{ code: name, says: say(`job.seal.${name}`, params) }] : [];
  });
