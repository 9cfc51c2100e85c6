import { useState } from 'react';
import { LineBox } from '../../../components/field/LineBox';
import { oneLine } from '../../../components/field/oneLine';
import { useWords } from '../../../components/words';
import { StepFrame } from '../step/StepFrame';
import { useAnswer } from '../step/useAnswer';
import { SaveButton } from './SaveButton';
import type { StepOf } from './StepAnswer';

/** Capitals and spaces are slips of the thumb; any other difference is another tag. */
const sameTag = (a: string, b: string): boolean =>
  a.replace(/\s/g, '').toUpperCase() === b.replace(/\s/g, '').toUpperCase();

/** The tag read off the thing itself. A tag that is another one is refused: it is the wrong panel, or a slip. */
export function ScanAnswer({ step }: { step: StepOf<'scan'> }) {
  const { t } = useWords();
  const { answer, saving, failed } = useAnswer(step);
  const [typed, setTyped] = useState('');
  const [wrong, setWrong] = useState<string>();
  const text = oneLine(typed);
  async function check() {
    if (sameTag(text, step.ask.expect)) await answer({ kind: 'scan', text: step.ask.expect, typed: true });
    else setWrong(text);
  }
  return (
    <StepFrame
      step={step}
      failed={failed}
      answer={
        <LineBox
          label={t('field.scan.type')}
          value={typed}
          maxLength={200}
          onChange={(value) => {
            setTyped(value);
            setWrong(undefined);
          }}
          error={
            wrong === undefined ? undefined : t('field.scan.wrong', { typed: wrong, expect: step.ask.expect })
          }
        />
      }
      primary={
        <SaveButton saving={saving} disabled={!text} onSave={check}>
          {text ? t('field.saveValue', { value: text }) : t('field.scan.first')}
        </SaveButton>
      }
    />
  );
}
