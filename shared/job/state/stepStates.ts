/** The steps of a job as they stand, each with everything that was ever answered on it. */
import type { AnswerRecord, StepState } from '../types';
import type { Replayed } from '../view/replay';
import { decisionOf } from '../view/holds';
import { before } from '../order/placed';
import { countingAnswers } from '../view/countingAnswers';
import { ownStanding, type Standing } from '../view/stepStatus';
import type { Answered, View } from '../view/view';
import { answerersOf, wholeStatus } from '../view/wholeStatus';

function recordOf({ placed, person, value, verdict, refusals, round }: Answered): AnswerRecord {
  const { entry, known } = placed;
  return {
    entry: entry.id,
    person,
    at: entry.at,
    value,
    ...(known?.kind === 'answer' && { shown: known.body.shown }),
    verdict,
    ...(refusals && { refusals }),
    round,
  };
}

const shown = ({ status, answer }: Standing) => ({ status, ...(answer && { answer: recordOf(answer) }) });

function whoOf(view: View, step: number): string[] {
  const asked = view.setting.lookup.steps[step];
  if (asked?.by !== 'each') return [''];
  const { ask } = asked;
  if (ask.kind !== 'lock-on' && ask.kind !== 'lock-off') return answerersOf(view, step);
  // Whoever had a lock there is asked about it, whether they answered the step or not.
  const locked = view.locks.filter(({ isolator }) => isolator === ask.isolator).map(({ person }) => person);
  return [...new Set([...answerersOf(view, step), ...locked])].sort();
}

function holdOf(view: View, step: number): StepState['hold'] {
  const holds = view.holds.get(step) ?? [];
  const held = holds.findLast((each) => !decisionOf(view, each)) ?? holds.at(-1);
  if (!held) return undefined;
  const { placed } = held;
  const decided = decisionOf(view, held)?.known.body;
  const { id, at } = placed.entry;
  return { entry: id, person: placed.person, at, body: placed.known.body, ...(decided && { decided }) };
}

/** The foreman's words against a step, until it is answered again. */
function returnedOf(view: View, step: number): StepState['returned'] {
  const id = view.setting.lookup.steps[step]?.id;
  const last = view.returned.findLast(({ known }) => known.body.steps.some((each) => each.step === id));
  const answered = last && countingAnswers(view, step).some(({ placed }) => before(last, placed));
  const said = last?.known.body.steps.find((each) => each.step === id);
  return last && said && !answered ? { entry: last.entry.id, words: said.words } : undefined;
}

export function stepStates({ view, judged }: Replayed): Record<string, StepState> {
  const { steps } = view.setting.lookup;
  const history = new Map<number, AnswerRecord[]>();
  for (const { answer } of judged)
    if (answer) history.set(answer.step, [...(history.get(answer.step) ?? []), recordOf(answer)]);
  return Object.fromEntries(
    steps.map((step, number): [string, StepState] => {
      const hold = holdOf(view, number);
      const returned = returnedOf(view, number);
      return [
        step.id,
        {
          step,
          by: Object.fromEntries(
            whoOf(view, number).map((person) => [person, shown(ownStanding(view, number, person))]),
          ),
          status: wholeStatus(view, number),
          history: history.get(number) ?? [],
          ...(hold && { hold }),
          ...(returned && { returned }),
        },
      ];
    }),
  );
}
