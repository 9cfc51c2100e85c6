/** Which answers of a record were not simply in limits, each with how its step ended: one truth for page and print. */
import type { RecordDocument } from './recordDocument';

type Verdict = RecordDocument['deadTests'][number]['verdict'];

export interface RecordException {
  /** The verdict of the answer that makes it an exception. */
  verdict: Exclude<Verdict, 'ok'>;
  /** The step in the words that were seen; null for a dead test, whose place says it. */
  shown: string | null;
  /** The two terminals of a dead test. */
  between: readonly [terminal: string, second: string] | null;
  answer: string;
  person: string;
  at: string;
  /** What was found on the same step afterwards, in order. */
  then: string[];
}

interface Told {
  key: string;
  verdict: Verdict;
  shown: string | null;
  between: RecordException['between'];
  answer: string;
  person: string;
  at: string;
}

const answered = ({ points, steps }: RecordDocument): Told[] =>
  [...points.flatMap(({ answers }) => answers), ...steps].map(
    ({ step, shown, answer, person, at, verdict }) => ({
      key: step,
      verdict,
      shown,
      between: null,
      answer,
      person,
      at,
    }),
  );

const measured = ({ deadTests }: RecordDocument): Told[] =>
  deadTests.map(({ terminal, second, supply, pair, value, unit, person, at, verdict }) => ({
    key: [terminal, second, supply, pair, unit].join('\n'),
    verdict,
    shown: null,
    between: [terminal, second],
    answer: `${value} ${unit}`,
    person,
    at,
  }));

/** Dead tests first; a step that went wrong twice stands twice. */
export function recordExceptions(document: RecordDocument): RecordException[] {
  const all = [...measured(document), ...answered(document)];
  return all.flatMap(({ key, verdict, ...told }, index) =>
    verdict === 'ok'
      ? []
      : [
          {
            verdict,
            ...told,
            then: all
              .filter((later, place) => place > index && later.key === key)
              .map(({ answer }) => answer),
          },
        ],
  );
}
