import { useState } from 'react';
import type { StepState } from '../../../../shared/job/types';
import { clockWords } from '../../../components/field/clockWords';
import { FieldButton } from '../../../components/field/FieldButton';
import { MarkedText } from '../../../components/field/MarkedText';
import { oneLine } from '../../../components/field/oneLine';
import { RadioList } from '../../../components/field/RadioList';
import { WordsBox } from '../../../components/field/WordsBox';
import { useWords } from '../../../components/words';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';
import { useSave } from '../job/useSave';
import { answerWords } from '../step/answerWords';

/** Two people answered one step differently, neither knowing of the other: the foreman says which one counts, and why. */
function Choose({ stepState }: { stepState: StepState }) {
  const { t, language } = useWords();
  const { marked, plain, nameOf } = useFieldJob();
  const { save, saving, failed } = useSave();
  const [entry, setEntry] = useState<string>();
  const [words, setWords] = useState('');
  const { step, history } = stepState;
  return (
    <div className="grid gap-2 border-2 border-ink bg-sheet p-2">
      <p className="m-0 font-bold">
        <MarkedText text={marked(step.title)} look="bold" />
      </p>
      <RadioList
        legend={t('field.review.twoTitle')}
        options={history
          .filter(({ verdict }) => verdict !== 'refused')
          .map((answer) => ({
            value: answer.entry,
            label: t('field.summary.history', {
              answer: answerWords(step, answer.value, t, plain),
              name: nameOf(answer.person),
              at: clockWords(answer.at, language, new Date()),
            }),
          }))}
        chosen={entry}
        onChoose={setEntry}
      />
      <WordsBox label={t('field.review.why')} value={words} rows={2} onChange={setWords} />
      <NotSaved code={failed} />
      <FieldButton
        disabled={!entry || !oneLine(words) || saving}
        onClick={() => {
          if (entry) void save('chosen', { step: step.id, entry, words: oneLine(words) });
        }}
      >
        {t('field.review.choose')}
      </FieldButton>
    </div>
  );
}

/** Every step with two answers, for the foreman. */
export function ChooseAnswers() {
  const { pack, state } = useFieldJob();
  return pack.checklist.steps
    .flatMap(({ id }) => state.steps[id] ?? [])
    .filter(({ status }) => status === 'two-answers')
    .map((stepState) => <Choose key={stepState.step.id} stepState={stepState} />);
}
