import { useState } from 'react';
import type { Step } from '../../../../shared/checklist/types';
import type { AnswerRecord } from '../../../../shared/job/types';
import { FieldButton } from '../../../components/field/FieldButton';
import { MarkedText } from '../../../components/field/MarkedText';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { answerWords } from '../step/answerWords';
import { HoldSheet } from '../step/HoldSheet';
import { StepFrame } from '../step/StepFrame';
import { limitWords } from '../step/unitWords';
import { FixedSheet } from './FixedSheet';
import { RoundSheet } from './RoundSheet';

interface OutOfLimitsProps {
  step: Step;
  answer: AnswerRecord;
  onAgain: () => void;
}

type Opened = 'fixed' | 'hold' | 'round';

function WhatWasFound({ step, answer }: { step: Step; answer: AnswerRecord }) {
  const { t } = useWords();
  const { marked, plain } = useFieldJob();
  const reading = step.ask.kind === 'reading' ? step.ask : undefined;
  return (
    <div role="alert" className="border-[3px] border-ink bg-sheet px-3 py-2">
      <p className="m-0 text-[1.15rem] leading-snug font-bold">
        {t('field.out.found', { found: answerWords(step, answer.value, t, plain) })}
      </p>
      {reading && <p className="m-0">{t('field.out.limits', { limits: limitWords(reading, t) })}</p>}
      {reading?.why && (
        <p className="m-0 text-muted">
          <MarkedText text={marked(reading.why)} look="bold" />
        </p>
      )}
      <p className="m-0 mt-1">{t(step.stage === 'prove-points' ? 'field.out.doLive' : 'field.out.do')}</p>
    </div>
  );
}

/** An answer out of limits is kept and the step stays open: measure again, fix and measure again, or hold. */
export function OutOfLimits({ step, answer, onAgain }: OutOfLimitsProps) {
  const { t } = useWords();
  const [opened, setOpened] = useState<Opened>();
  const close = () => {
    setOpened(undefined);
  };
  const open = (what: Opened) => () => {
    setOpened(what);
  };
  // Nothing is rewired live: a fault found while proving goes back through isolation.
  const isLive = step.stage === 'prove-points' || step.stage === 'restore-motion';
  return (
    <StepFrame
      step={step}
      answer={
        <>
          <WhatWasFound step={step} answer={answer} />
          {isLive ? (
            <FieldButton onClick={open('round')}>{t('field.out.round')}</FieldButton>
          ) : (
            <FieldButton onClick={open('fixed')}>{t('field.out.fixed')}</FieldButton>
          )}
          <FieldButton onClick={open('hold')}>{t('field.out.hold')}</FieldButton>
          {opened === 'fixed' && <FixedSheet step={step} onClose={close} onAgain={onAgain} />}
          {opened === 'round' && <RoundSheet step={step} onClose={close} />}
          {opened === 'hold' && <HoldSheet step={step} reason="out-of-limit" onClose={close} />}
        </>
      }
      primary={
        <FieldButton look="primary" className="min-h-[3.75rem] text-[1.2rem]" onClick={onAgain}>
          {t(step.ask.kind === 'reading' ? 'field.out.again' : 'field.out.lookAgain')}
        </FieldButton>
      }
    />
  );
}
