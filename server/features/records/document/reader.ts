/** What the parts of a record's document share: names, rounds and the language it is written in. */
import type { Language } from '../../../../shared/api/common';
import type { RecordDocument } from '../../../../shared/api/recordDocument';
import type { Step } from '../../../../shared/checklist/types';
import type { AnswerRecord } from '../../../../shared/job/types';
import type { Text } from '../../../../shared/panel/says';
import { render } from '../../../../shared/wording/render';
import { foundWords } from '../../jobs/foundWords';
import type { FoldedJob } from '../../jobs/folding';

export interface Reader {
  folded: FoldedJob;
  language: Language;
  nameOf: (person: string) => string;
  /** Number of a round by its name; 0 for one nobody knows. */
  roundOf: (round: string) => number;
  say: (text: Text) => string;
}

export function readerOf(folded: FoldedJob, language: Language, names: ReadonlyMap<string, string>): Reader {
  const { state, pack } = folded;
  // The first round is started by no entry: its name is empty.
  const rounds = new Map([['', 1] as const, ...state.rounds.map(({ id, number }) => [id, number] as const)]);
  return {
    folded,
    language,
    nameOf: (person) => names.get(person) ?? '?',
    roundOf: (round) => rounds.get(round) ?? 0,
    say: (text) => render(language, text, pack.wording[language]),
  };
}

type RecordedAnswer = RecordDocument['steps'][number];

/** One answer, with the words that its giver saw. */
export const recordedAnswer = (reader: Reader, step: Step, answer: AnswerRecord): RecordedAnswer => ({
  step: step.id,
  stage: step.stage,
  shown: answer.shown ?? reader.say(step.title),
  answer: foundWords(step, answer.value, reader.language, reader.folded.pack.wording[reader.language]),
  person: reader.nameOf(answer.person),
  at: answer.at,
  round: reader.roundOf(answer.round),
  verdict: answer.verdict,
});
