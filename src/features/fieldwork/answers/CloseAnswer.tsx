import { useId, useState } from 'react';
import { NumberPad } from '../../../components/field/NumberPad';
import { padNumber } from '../../../components/field/padPress';
import { ReadingBox } from '../../../components/field/ReadingBox';
import { SignalBox } from '../../../components/SignalBox';
import { useWords } from '../../../components/words';
import { StepFrame } from '../step/StepFrame';
import { useAnswer } from '../step/useAnswer';
import { SaveButton } from './SaveButton';
import type { StepOf } from './StepAnswer';

/** "Look. Count the padlocks." The phone knows only the locks it has heard of: eyes decide, and only 0 goes on. */
export function CloseAnswer({ step }: { step: StepOf<'close'> }) {
  const { t } = useWords();
  const { act, saving, failed } = useAnswer(step);
  const [typed, setTyped] = useState('');
  const id = useId();
  const counted = padNumber(typed);
  const { isolator } = step.ask;
  const save = async () => {
    if (counted === 0) await act('closed', { isolator, step: step.id, counted });
  };
  return (
    <StepFrame
      step={step}
      failed={failed}
      answer={
        <>
          <p id={`${id}-count`} className="m-0 text-[1.2rem] font-bold">
            {t('field.closing.count', { isolator })}
          </p>
          <ReadingBox
            id={id}
            label={t('field.closing.count', { isolator })}
            value={typed}
            unit={t('field.unit.padlocks')}
            invalid={counted !== undefined && counted > 0}
            onChange={setTyped}
            onEnter={() => void save()}
          />
          {counted !== undefined && counted > 0 && (
            <div role="alert">
              <SignalBox signal="danger">{t('field.closing.notZero', { counted, isolator })}</SignalBox>
            </div>
          )}
          <NumberPad value={typed} decimal={false} onChange={setTyped} words={t('field.reading.pad')} />
        </>
      }
      primary={
        <SaveButton saving={saving} disabled={counted !== 0} onSave={save}>
          {t(counted === 0 ? 'field.closing.save' : 'field.closing.first', { isolator })}
        </SaveButton>
      }
    />
  );
}
