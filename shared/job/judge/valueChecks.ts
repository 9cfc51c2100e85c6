/** What an answer itself may have against it, beside the gate of its step. */
import type { AnswerValue } from '../entry';
import { refuse } from '../gate/gateFacts';
import { inLimits } from '../known/inLimits';
import { before, isOf, isKnownTo, type Placed } from '../order/placed';
import type { AnswerRecord, Refusal } from '../types';
import { isOn, ownLock } from '../view/locks';
import { isInRound } from '../view/rounds';
import type { View } from '../view/view';

export interface ValueFacts {
  view: View;
  placed: Placed;
  step: number;
  value: AnswerRecord['value'];
}
type ValueCheck = (facts: ValueFacts) => Refusal | undefined;

const wrongKind: ValueCheck = ({ view, placed, step, value }) => {
  const ask = view.setting.lookup.steps[step]?.ask;
  const fits = ask && inLimits(ask, value, placed.entry.at) !== 'wrong-kind';
  return fits ? undefined : refuse('wrong-kind');
};

/** One padlock is on one isolator at a time. */
const lockElsewhere: ValueCheck = ({ view, placed }) => {
  if (!isOf(placed, 'lock-on')) return undefined;
  const { lock, isolator } = placed.known.body;
  const other = view.locks.find((each) => each.lock === lock && isOn(each));
  return other ? refuse('lock-elsewhere', { lock, isolator, other: other.isolator }) : undefined;
};

const notThatLock: ValueCheck = ({ view, placed }) => {
  if (!isOf(placed, 'lock-off')) return undefined;
  const { lock, isolator } = placed.known.body;
  const isMine = view.locks.some(
    (each) => isOn(each) && each.person === placed.person && each.lock === lock && each.isolator === isolator,
  );
  return isMine ? undefined : refuse('not-that-lock', { lock, isolator });
};

const sameReading = (a: AnswerRecord['value'], b: AnswerValue): boolean =>
  a.kind === 'reading' && b.kind === 'reading' && a.value === b.value;

/** Who watched stood under their own locks by then: a reading taken before those says nothing for them. */
const isUnderOwnLocks = (view: View, person: string, reading: Placed): boolean =>
  view.setting.lookup.isolators.every((isolator) => {
    const own = ownLock(view, isolator, person);
    return own !== undefined && before(own.on, reading);
  });

/** A watched reading repeats the one it names, which a colleague took in this round under the watcher's own locks. */
const notWatched: ValueCheck = ({ view, placed, step }) => {
  if (!isOf(placed, 'answer') || placed.known.body.watched === undefined) return undefined;
  const { watched, value } = placed.known.body;
  const isThere = view.answers[step]?.some(
    (answer) =>
      answer.placed.entry.id === watched &&
      answer.person !== placed.person &&
      isKnownTo(answer.placed, placed) &&
      isInRound(view, answer.placed) &&
      isUnderOwnLocks(view, placed.person, answer.placed) &&
      sameReading(answer.value, value),
  );
  return isThere ? undefined : refuse('not-watched');
};

export const valueChecks: readonly { name: string; check: ValueCheck }[] = [
  { name: 'wrong-kind', check: wrongKind },
  { name: 'lock-elsewhere', check: lockElsewhere },
  { name: 'not-that-lock', check: notThatLock },
  { name: 'not-watched', check: notWatched },
];

export const valueRefusals = (facts: ValueFacts): Refusal[] =>
  valueChecks.flatMap(({ check }) => check(facts) ?? []);
