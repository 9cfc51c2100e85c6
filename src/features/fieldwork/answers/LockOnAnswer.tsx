import { useState } from 'react';
import { LineBox } from '../../../components/field/LineBox';
import { oneLine } from '../../../components/field/oneLine';
import { useWords } from '../../../components/words';
import { ownLocks } from '../job/ownLocks';
import { useFieldJob } from '../job/useFieldJob';
import { useSave } from '../job/useSave';
import { useLockElsewhere } from '../locks/useLockElsewhere';
import { StepFrame } from '../step/StepFrame';
import { useAnswer } from '../step/useAnswer';
import { SaveButton } from './SaveButton';
import type { StepOf } from './StepAnswer';

/** One's own lock on an isolator: the number on the padlock, typed big. */
export function LockOnAnswer({ step }: { step: StepOf<'lock-on'> }) {
  const { t } = useWords();
  const { state, me } = useFieldJob();
  const wrong = useSave();
  const { act, saving, failed } = useAnswer(step);
  const [typed, setTyped] = useState('');
  const lock = oneLine(typed);
  const { isolator } = step.ask;
  // One padlock cannot hang in two places: the number was misread, or it is another lock.
  const elsewhere = useLockElsewhere(lock);
  const own = ownLocks(state, me.person).find((each) => each.isolator === isolator);
  async function keep() {
    // A number typed wrongly before comes off first: the record shows both, and the dead tests count anew.
    const off = own && { isolator, lock: own.lock };
    if (off && !(await wrong.save('lock-off', off, t('field.lockOn.replace', { ...off, now: lock })))) return;
    await act('lock-on', { isolator, lock, step: step.id });
  }
  return (
    <StepFrame
      step={step}
      failed={failed ?? wrong.failed}
      answer={
        <LineBox
          label={t('field.lockOn.number')}
          value={typed}
          inputMode="numeric"
          maxLength={40}
          onChange={setTyped}
          className="text-[2.4rem]!"
          error={elsewhere && t('field.lockOn.elsewhere', { lock, isolator: elsewhere.isolator })}
        />
      }
      primary={
        <SaveButton saving={saving || wrong.saving} disabled={!lock || Boolean(elsewhere)} onSave={keep}>
          {lock ? t('field.lockOn.save', { lock, isolator }) : t('field.lockOn.type')}
        </SaveButton>
      }
    />
  );
}
