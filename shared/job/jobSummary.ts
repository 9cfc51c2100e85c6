/** What is signed: one summary, exceptions first, the same for sign screen, record and print. */
import type { Checklist } from '../checklist/types';
import { knownOf } from './known/knownOf';
import type { AnswerRecord, JobState, LockState, StepState } from './types';

export interface SummaryAnswer {
  entry: string;
  person: string;
  at: string;
  value: AnswerRecord['value'];
  verdict: AnswerRecord['verdict'];
  round: string;
}

export interface SummaryStep {
  step: string;
  status: StepState['status'];
  answers: SummaryAnswer[];
}

export interface JobSummary {
  scope: string[];
  /** Steps that were once out of limits, with every answer: how it ended is the status. */
  outOfLimits: SummaryStep[];
  holds: {
    step: string;
    person: string;
    words: string;
    reason: string;
    decision?: string;
    decided?: string;
  }[];
  twoAnswers: SummaryStep[];
  /** Answers that were refused at their gate: history that counts for nothing. */
  refused: SummaryStep[];
  returned: { step: string; words: string; person: string; at: string }[];
  rounds: JobState['rounds'];
  locks: LockState[];
  /** Every reading that stands, for the table. */
  readings: { step: string; person: string; value: number; unit: string; low?: number; high?: number }[];
  contradictions: { code: string; entries: string[] }[];
  drawingDiffers: { person: string; at: string; says: string }[];
  temporariesLeft: number;
}

const inSummary = ({ entry, person, at, value, verdict, round }: AnswerRecord): SummaryAnswer => ({
  entry,
  person,
  at,
  value,
  verdict,
  round,
});

const summaryStep = ({ step, status, history }: StepState): SummaryStep => ({
  step: step.id,
  status,
  answers: history.map(inSummary),
});

const hasVerdict =
  (verdict: AnswerRecord['verdict']) =>
  ({ history }: StepState): boolean =>
    history.some((each) => each.verdict === verdict);

/** Two answers stood side by side at some time: somebody chose, or they still stand. */
const hadTwoAnswers = ({ status, by }: StepState, chosen: boolean): boolean =>
  status === 'two-answers' || chosen || Object.values(by).some((own) => own.status === 'two-answers');

function holdIn({ step, hold }: StepState): JobSummary['holds'] {
  if (!hold) return [];
  const { body, person } = hold;
  return [
    {
      step: step.id,
      person,
      words: body.words,
      reason: body.reason,
      ...(hold.decided && { decision: hold.decided.decision, decided: hold.decided.words }),
    },
  ];
}

function readingsIn({ step, by }: StepState): JobSummary['readings'] {
  const { ask } = step;
  if (ask.kind !== 'reading') return [];
  return Object.values(by).flatMap(({ answer }) =>
    answer?.value.kind === 'reading'
      ? [
          {
            step: step.id,
            person: answer.person,
            value: answer.value.value,
            unit: ask.unit,
            ...(ask.low !== undefined && { low: ask.low }),
            ...(ask.high !== undefined && { high: ask.high }),
          },
        ]
      : [],
  );
}

/** In the order of the checklist throughout. */
export function jobSummary(checklist: Checklist, state: JobState): JobSummary {
  const steps = checklist.steps.flatMap(({ id }) => state.steps[id] ?? []);
  const chosen = new Set(state.chosen.map(({ body }) => body.step));
  return {
    scope: checklist.scope,
    outOfLimits: steps.filter(hasVerdict('out')).map(summaryStep),
    holds: steps.flatMap(holdIn),
    twoAnswers: steps.filter((each) => hadTwoAnswers(each, chosen.has(each.step.id))).map(summaryStep),
    refused: steps.filter(hasVerdict('refused')).map(summaryStep),
    returned: state.returns.flatMap(({ person, at, steps: sent }) =>
      sent.map(({ step, words }) => ({ step, words, person, at })),
    ),
    rounds: state.rounds,
    locks: state.locks,
    readings: steps.flatMap(readingsIn),
    contradictions: [...state.contradictions, ...state.settled].map(({ code, entries }) => ({
      code,
      entries,
    })),
    drawingDiffers: state.drawingDiffers.map(({ person, at, body }) => ({ person, at, says: body.says })),
    temporariesLeft: knownOf(checklist, state).temporariesLeft,
  };
}
