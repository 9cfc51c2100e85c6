import { useEffect, useState } from 'react';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { StepFrame } from '../step/StepFrame';
import { useAnswer } from '../step/useAnswer';
import { SaveButton } from './SaveButton';
import type { StepOf } from './StepAnswer';
import { WaitClock } from './waitClock';

const twoDigits = (value: number): string => String(value).padStart(2, '0');
const clockFace = (seconds: number): string => `${Math.floor(seconds / 60)}:${twoDigits(seconds % 60)}`;

function usePassedS(step: string): number {
  const { pack, state } = useFieldJob();
  const [clock] = useState(() => new WaitClock(pack.job.id, step, state.round.id));
  const [passed, setPassed] = useState(0);
  useEffect(() => {
    const timer = setInterval(() => {
      setPassed(clock.passedS());
    }, 250);
    return () => {
      clearInterval(timer);
    };
  }, [clock]);
  return passed;
}

/** A wait that cannot be cut short: stored charge leaves at its own pace. */
export function WaitAnswer({ step }: { step: StepOf<'wait'> }) {
  const { t } = useWords();
  const { answer, saving, failed } = useAnswer(step);
  const passed = usePassedS(step.id);
  const left = Math.max(0, Math.ceil(step.ask.seconds - passed));
  return (
    <StepFrame
      step={step}
      failed={failed}
      answer={
        <div className="border-[3px] border-ink bg-sheet px-3.5 py-2">
          <p role="timer" className="m-0 font-mono text-[2.6rem] leading-none font-semibold">
            {clockFace(left)}
          </p>
          <p role="status" className="m-0">
            {t(left > 0 ? 'field.wait.left' : 'field.wait.over')}
          </p>
        </div>
      }
      primary={
        <SaveButton
          saving={saving}
          disabled={left > 0}
          onSave={() => answer({ kind: 'wait', waitedS: Math.floor(passed) })}
        >
          {left > 0 ? t('field.wait.wait') : t('field.wait.done')}
        </SaveButton>
      }
    />
  );
}
