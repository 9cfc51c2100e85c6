/** The answers of a job: dead tests, points, and the steps of no point. */
import type { RecordDocument } from '../../../../shared/api/recordDocument';
import type { Step } from '../../../../shared/checklist/types';
import type { AnswerRecord } from '../../../../shared/job/types';
import { recordedAnswer, type Reader } from './reader';

type DeadTest = RecordDocument['deadTests'][number];

const historyOf = ({ folded }: Reader, step: Step): AnswerRecord[] =>
  folded.state.steps[step.id]?.history ?? [];
const isDeadTest = (step: Step): boolean => step.ask.kind === 'reading' && step.ask.dead !== undefined;

function deadTestsOf(reader: Reader, step: Step): DeadTest[] {
  const { ask } = step;
  if (ask.kind !== 'reading' || !ask.dead) return [];
  const { terminal, second, pair, supply } = ask.dead;
  return historyOf(reader, step).flatMap(({ value, person, at, round, verdict }) =>
    value.kind === 'reading'
      ? [
          {
            terminal,
            second,
            pair,
            supply,
            value: value.value,
            unit: ask.unit,
            person: reader.nameOf(person),
            at,
            round: reader.roundOf(round),
            verdict,
          },
        ]
      : [],
  );
}

export const deadTests = (reader: Reader): DeadTest[] =>
  reader.folded.pack.checklist.steps.flatMap((step) => deadTestsOf(reader, step));

const answersOf = (reader: Reader, steps: readonly Step[]) =>
  steps
    .filter((step) => !isDeadTest(step))
    .flatMap((step) => historyOf(reader, step).map((answer) => recordedAnswer(reader, step, answer)));

export function points(reader: Reader): RecordDocument['points'] {
  const { panel, checklist } = reader.folded.pack;
  const byPoint = new Map<string, Step[]>();
  for (const step of checklist.steps)
    if (step.where?.point !== undefined)
      byPoint.set(step.where.point, [...(byPoint.get(step.where.point) ?? []), step]);
  const inPanel = new Map(panel.points.map((point) => [point.address, point]));
  return checklist.scope.map((address) => ({
    address,
    terminal: inPanel.get(address)?.terminal ?? '?',
    description: inPanel.get(address)?.description ?? '?',
    answers: answersOf(reader, byPoint.get(address) ?? []),
  }));
}

/** Steps of no point, and of a point outside the scope: nothing that was answered is left out. */
export function otherSteps(reader: Reader): RecordDocument['steps'] {
  const { checklist } = reader.folded.pack;
  const scope = new Set(checklist.scope);
  return answersOf(
    reader,
    checklist.steps.filter(({ where }) => where?.point === undefined || !scope.has(where.point)),
  );
}
