/** The folded job as the office reads it, in a language. */
import type { Language } from '../../../shared/api/common';
import type { JobStateView } from '../../../shared/api/jobs';
import type { Step } from '../../../shared/checklist/types';
import type { AnswerRecord, JobState, StepState } from '../../../shared/job/types';
import { render } from '../../../shared/wording/render';
import type { FoldedJob } from './folding';
import { foundWords } from './foundWords';

type StepView = JobStateView['steps'][number];

interface Reader {
  language: Language;
  carried: Record<string, string>;
  nameOf: (person: string) => string;
  /** Number of a round by its name; 0 for one nobody knows. */
  roundOf: (round: string) => number;
}

function readerOf({ pack, facts, state }: FoldedJob, language: Language): Reader {
  const names = new Map(facts.people.map(({ id, name }) => [id, name]));
  // The first round is started by no entry: its name is empty.
  const rounds = new Map([['', 1] as const, ...state.rounds.map(({ id, number }) => [id, number] as const)]);
  return {
    language,
    carried: pack.wording[language],
    nameOf: (person) => names.get(person) ?? '?',
    roundOf: (round) => rounds.get(round) ?? 0,
  };
}

const answerView = (reader: Reader, step: Step, answer: AnswerRecord): StepView['answers'][number] => ({
  person: reader.nameOf(answer.person),
  at: answer.at,
  found: foundWords(step, answer.value, reader.language, reader.carried),
  verdict: answer.verdict,
  round: reader.roundOf(answer.round),
});

function stepView(reader: Reader, step: Step, state: StepState | undefined): StepView {
  const hold = state?.hold;
  return {
    id: step.id,
    stage: step.stage,
    title: render(reader.language, step.title, reader.carried),
    status: state?.status ?? 'open',
    answers: (state?.history ?? []).map((answer) => answerView(reader, step, answer)),
    hold: hold ? { person: reader.nameOf(hold.person), at: hold.at, words: hold.body.words } : null,
    returned: state?.returned?.words ?? null,
  };
}

const stagesView = ({ stages }: JobState): JobStateView['stages'] =>
  stages.map(({ stage, status, done, of }) => ({ stage, status, done, of }));

export function stateView(folded: FoldedJob, language: Language): JobStateView {
  const reader = readerOf(folded, language);
  return {
    round: folded.state.round.number,
    stages: stagesView(folded.state),
    steps: folded.pack.checklist.steps.map((step) => stepView(reader, step, folded.state.steps[step.id])),
  };
}
