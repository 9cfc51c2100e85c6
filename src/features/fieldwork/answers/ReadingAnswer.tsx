import { useId, useState } from 'react';
import { FieldButton } from '../../../components/field/FieldButton';
import { MarkedText } from '../../../components/field/MarkedText';
import { NumberPad } from '../../../components/field/NumberPad';
import { padNumber } from '../../../components/field/padPress';
import { ReadingBox } from '../../../components/field/ReadingBox';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { StepFrame } from '../step/StepFrame';
import { tenTimes } from '../step/tenTimes';
import { limitWords, readingWords, unitSign } from '../step/unitWords';
import { useAnswer } from '../step/useAnswer';
import { meterOf } from './meterOf';
import { SaveButton } from './SaveButton';
import { WatchedReadings } from './WatchedReadings';
import type { StepOf } from './StepAnswer';

function DidYouMean({ value, unit, onTake }: { value: number; unit: string; onTake: () => void }) {
  const { t } = useWords();
  return (
    <FieldButton look="quiet" onClick={onTake}>
      {t('field.reading.didYouMean', { value, unit })}
    </FieldButton>
  );
}

/** The limit while typing, and which meter reads it. */
function LimitLine({ id, step }: { id: string; step: StepOf<'reading'> }) {
  const { t } = useWords();
  const { state, pack, me, marked } = useFieldJob();
  const meter = step.ask.unit.startsWith('V') ? meterOf(pack.checklist, state, me.person) : undefined;
  return (
    <div id={id} className="text-[0.95rem] leading-tight text-muted">
      <p className="m-0 flex flex-wrap justify-between gap-x-3">
        <span>{limitWords(step.ask, t)}</span>
        {meter && <span className="font-mono">{t('field.reading.meter', { number: meter.number })}</span>}
      </p>
      {step.ask.why && (
        <p className="m-0">
          <MarkedText text={marked(step.ask.why)} look="bold" />
        </p>
      )}
    </div>
  );
}

/** A reading, on our own pad. The button says the value, so that a slip is read before it is saved. */
export function ReadingAnswer({ step }: { step: StepOf<'reading'> }) {
  const { t } = useWords();
  const { plain } = useFieldJob();
  const { answer, watch, saving, failed } = useAnswer(step);
  const [typed, setTyped] = useState('');
  const limitId = useId();
  const { ask } = step;
  const value = padNumber(typed);
  const meant = value === undefined ? undefined : tenTimes(ask, value);
  const save = async () => {
    if (value !== undefined) await answer({ kind: 'reading', value });
  };
  const whole = ask.unit === 'padlocks';
  return (
    <StepFrame
      step={step}
      failed={failed}
      answer={
        <>
          <ReadingBox
            id={`${limitId}-box`}
            label={`${plain(step.title)} (${unitSign(ask.unit, t)})`}
            value={typed}
            unit={unitSign(ask.unit, t)}
            describedBy={limitId}
            minus={ask.unit === 'V DC' || (ask.low ?? 0) < 0}
            onChange={setTyped}
            onEnter={() => void save()}
          />
          <LimitLine id={limitId} step={step} />
          {meant !== undefined && (
            <DidYouMean
              value={meant}
              unit={unitSign(ask.unit, t)}
              onTake={() => {
                setTyped(String(meant));
              }}
            />
          )}
          <WatchedReadings step={step} onWatched={watch} />
          <NumberPad value={typed} onChange={setTyped} decimal={!whole} words={t('field.reading.pad')} />
        </>
      }
      primary={
        <SaveButton saving={saving} disabled={value === undefined} onSave={save}>
          {value === undefined
            ? t('field.reading.type')
            : t('field.reading.save', { reading: readingWords(value, ask.unit, t) })}
        </SaveButton>
      }
    />
  );
}
