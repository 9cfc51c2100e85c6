import { useEffect, useId, useState } from 'react';
import { ActionBar } from '../../../components/field/ActionBar';
import { FieldButton } from '../../../components/field/FieldButton';
import { FieldPage } from '../../../components/field/FieldPage';
import { MarkedText } from '../../../components/field/MarkedText';
import { NumberPad } from '../../../components/field/NumberPad';
import { padNumber } from '../../../components/field/padPress';
import { ReadingBox } from '../../../components/field/ReadingBox';
import { SignalBox } from '../../../components/SignalBox';
import { useWords } from '../../../components/words';
import { SaveButton } from '../answers/SaveButton';
import { JobHeader } from '../job/JobHeader';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';
import { UnsentLine } from '../layout/UnsentLine';
import { limitWords, readingWords, unitSign } from '../step/unitWords';
import { useAnswer } from '../step/useAnswer';
import type { LiveReading } from './liveReading';

/** The same reading once more: a bad one leads back to the red screen, a good one lets the person go on. */
export function LiveMeasure({ live, onBack }: { live: LiveReading; onBack: () => void }) {
  const { t } = useWords();
  const { marked, plain } = useFieldJob();
  const { answer, saving, failed } = useAnswer(live.step);
  const [typed, setTyped] = useState('');
  const id = useId();
  const value = padNumber(typed);
  const unit = unitSign(live.ask.unit, t);
  useEffect(() => {
    document.getElementById(id)?.focus();
  }, [id]);
  const save = async () => {
    if (value !== undefined) await answer({ kind: 'reading', value });
  };
  return (
    <FieldPage
      header={<JobHeader stage={live.step.stage} />}
      banner={<UnsentLine />}
      answer={
        <>
          <ReadingBox
            id={id}
            label={`${plain(live.step.title)} (${unit})`}
            value={typed}
            unit={unit}
            describedBy={`${id}-limit`}
            minus={live.ask.unit === 'V DC'}
            onChange={setTyped}
            onEnter={() => void save()}
          />
          <p id={`${id}-limit`} className="m-0 text-[0.95rem] text-muted">
            {limitWords(live.ask, t)}
          </p>
          <NumberPad value={typed} onChange={setTyped} words={t('field.reading.pad')} />
          <NotSaved code={failed} />
        </>
      }
      footer={
        <ActionBar
          primary={
            <SaveButton saving={saving} disabled={value === undefined} onSave={save}>
              {value === undefined
                ? t('field.reading.type')
                : t('field.reading.save', { reading: readingWords(value, live.ask.unit, t) })}
            </SaveButton>
          }
        >
          <FieldButton onClick={onBack}>{t('field.live.backToWhy')}</FieldButton>
        </ActionBar>
      }
    >
      <h1 className="m-0 text-[1.4rem] leading-[1.25] font-bold">
        <MarkedText text={marked(live.step.title)} />
      </h1>
      <SignalBox signal="danger">{t('field.live.treatAsLive')}</SignalBox>
    </FieldPage>
  );
}
