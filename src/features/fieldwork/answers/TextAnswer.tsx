import { useState } from 'react';
import { oneLine } from '../../../components/field/oneLine';
import { WordsBox } from '../../../components/field/WordsBox';
import { useWords } from '../../../components/words';
import { StepFrame } from '../step/StepFrame';
import { useAnswer } from '../step/useAnswer';
import { SaveButton } from './SaveButton';
import type { StepOf } from './StepAnswer';

/** What was found, in the person's own words. */
export function TextAnswer({ step }: { step: StepOf<'text'> }) {
  const { t } = useWords();
  const { answer, saving, failed } = useAnswer(step);
  const [words, setWords] = useState('');
  const text = oneLine(words);
  return (
    <StepFrame
      step={step}
      failed={failed}
      answer={
        <WordsBox
          label={t('field.text.yours')}
          value={words}
          maxLength={step.ask.maxLength}
          rows={2}
          onChange={setWords}
        />
      }
      primary={
        <SaveButton saving={saving} disabled={!text} onSave={() => answer({ kind: 'text', text })}>
          {t('field.save')}
        </SaveButton>
      }
    />
  );
}
