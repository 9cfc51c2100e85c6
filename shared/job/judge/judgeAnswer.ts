/** Judges an answer, a lock or a closing by what it had seen: its gate, its value, its limits. */
import type { BodyOf } from '../entry';
import { gateRefusals } from '../gate/gateChecks';
import { inLimits } from '../known/inLimits';
import { isOf, type Placed } from '../order/placed';
import type { AnswerRecord } from '../types';
import { knownIn } from '../view/knownIn';
import { roundOf } from '../view/rounds';
import type { Answered, View } from '../view/view';
import { valueRefusals } from './valueChecks';

interface Given {
  step: number;
  value: AnswerRecord['value'];
}

const lock = ({ lock }: BodyOf<'lock-on' | 'lock-off'>): AnswerRecord['value'] => ({ kind: 'lock', lock });

/** Which step of the checklist an entry answers, and with what; undefined when it answers none. */
function givenBy(view: View, placed: Placed): Given | undefined {
  const { lookup } = view.setting;
  const at = (step: number | undefined, value: AnswerRecord['value']) =>
    step === undefined ? undefined : { step, value };
  if (isOf(placed, 'answer')) return at(lookup.numberOf.get(placed.known.body.step), placed.known.body.value);
  if (isOf(placed, 'lock-on'))
    return at(lookup.lockOn.get(placed.known.body.isolator), lock(placed.known.body));
  // Without its step it is no answer: a wrong number taken off the list, or somebody leaving early.
  if (isOf(placed, 'lock-off'))
    return placed.known.body.step === undefined
      ? undefined
      : at(lookup.lockOff.get(placed.known.body.isolator), lock(placed.known.body));
  if (isOf(placed, 'closed'))
    return at(lookup.close.get(placed.known.body.isolator), {
      kind: 'closed',
      counted: placed.known.body.counted,
    });
  return undefined;
}

export function judgeAnswer(view: View, placed: Placed): Answered | undefined {
  const given = givenBy(view, placed);
  const step = given && view.setting.lookup.steps[given.step];
  if (!given || !step) return undefined;
  const { person, entry } = placed;
  const facts = { known: knownIn(view, entry.pack), person, step, number: given.step };
  const refusals = [
    ...gateRefusals(facts),
    ...valueRefusals({ view, placed, step: given.step, value: given.value }),
  ];
  const limits = inLimits(step.ask, given.value, entry.at);
  return {
    placed,
    person,
    ...given,
    round: roundOf(view.rounds, placed),
    verdict: refusals.length > 0 || limits === 'wrong-kind' ? 'refused' : limits,
    ...(refusals.length > 0 && { refusals }),
  };
}
