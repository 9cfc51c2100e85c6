/** The state of a job as what a gate may ask. */
import type { Checklist } from '../../checklist/types';
import type { JobState, StepStatus } from '../types';
import type { Known, Whose } from './known';
import { lookupOf, stageNumber, type Lookup } from './lookup';
import { isPassed, isSettled } from './passing';
import { isIsolating } from './proving';

const none = { locked: [], missingLocks: [], missingTests: [], holds: false };

function statusesOf(lookup: Lookup, state: JobState) {
  const stateOf = (step: number) => state.steps[lookup.steps[step]?.id ?? ''];
  const whole = (step: number): StepStatus => stateOf(step)?.status ?? 'open';
  const own = (step: number, person: string): StepStatus => {
    const each = lookup.steps[step]?.by === 'each';
    return each ? (stateOf(step)?.by[person]?.status ?? 'open') : whole(step);
  };
  const passes = (step: number, whose: Whose): boolean => {
    const asked = lookup.steps[step];
    if (!asked) return true;
    const forAll = whose === undefined || asked.ask.kind === 'lock-off';
    return isPassed(forAll ? whole(step) : own(step, whose), asked.stage);
  };
  return { stateOf, whole, own, passes };
}

/** By person, the steps whose standing answer is theirs and that no standing signature of theirs names. */
function unsignedSteps(lookup: Lookup, state: JobState): Map<string, string[]> {
  const signed = new Set(
    state.signatures.flatMap(({ stands, person, body }) =>
      stands && 'steps' in body ? body.steps.map((step) => `${person} ${step}`) : [],
    ),
  );
  const left = new Map<string, string[]>();
  for (const { id } of lookup.steps)
    for (const { answer } of Object.values(state.steps[id]?.by ?? {})) {
      if (!answer || signed.has(`${answer.person} ${id}`)) continue;
      left.set(answer.person, [...(left.get(answer.person) ?? []), id]);
    }
  return left;
}

function once<T>(make: () => T): () => T {
  let made: { value: T } | undefined;
  return () => (made ??= { value: make() }).value;
}

function makeKnown(checklist: Checklist, state: JobState): Known {
  const lookup = lookupOf(checklist);
  const { whole, own, passes } = statusesOf(lookup, state);
  const firsts = new Map<string, number | undefined>();
  const terminals = new Map(
    Object.values(state.proofs).map(({ person, terminals: read }) => [person, new Set(read)]),
  );
  const unsigned = once(() => unsignedSteps(lookup, state));
  const people = state.people;
  return {
    lookup,
    accepted: state.accepted,
    workers: people.filter(({ part }) => part === 'electrician').map(({ id }) => id),
    foremen: people.filter(({ part }) => part === 'foreman').map(({ id }) => id),
    nameOf: (person) => people.find(({ id }) => id === person)?.name ?? '?',
    passes,
    firstLeft: (stage, whose) => {
      const key = `${stage} ${whose ?? ''}`;
      if (!firsts.has(key))
        firsts.set(
          key,
          lookup.inStage[stage]?.find((step) => !passes(step, whose)),
        );
      return firsts.get(key);
    },
    ownStatus: own,
    locksOn: state.locks.filter(({ offAt }) => offAt === undefined),
    proofOf: (person) => state.proofs[person] ?? { person, ...none },
    isRead: (step, person) => terminals.get(person)?.has(lookup.steps[step]?.id ?? '') ?? false,
    isolationOver: state.isolationOver,
    contradictions: state.contradictions,
    unreadable: state.unknown.length,
    dangers: state.dangers.flatMap((id) => lookup.numberOf.get(id) ?? []),
    stops: lookup.steps.flatMap((step, number) =>
      isIsolating(step) && state.steps[step.id]?.hold && !state.steps[step.id]?.hold?.decided ? [number] : [],
    ),
    isClear: (person) => state.clear.includes(person),
    temporariesLeft: state.temporaries.filter(({ body, removedBy }) => !body.removes && !removedBy).length,
    firstUnsettled: once(() => {
      const found = lookup.steps.findIndex(
        (_step, number) => (lookup.stageOf[number] ?? 0) < stageNumber.sign && !isSettled(whole(number)),
      );
      return found < 0 ? undefined : found;
    }),
    unsigned: (person) => unsigned().get(person) ?? [],
    allSigned: () => unsigned().size === 0,
    tookPart: (person) => state.tookPart.includes(person),
  };
}

const kept = new WeakMap<JobState, Known>();

/** Worked out once for each state. */
export function knownOf(checklist: Checklist, state: JobState): Known {
  const known = kept.get(state);
  if (known?.lookup === lookupOf(checklist)) return known;
  const made = makeKnown(checklist, state);
  kept.set(state, made);
  return made;
}
