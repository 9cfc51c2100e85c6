import { LockBox } from '../../../components/field/LockBox';
import { useWords } from '../../../components/words';
import { ownLocks } from '../job/ownLocks';
import { useFieldJob } from '../job/useFieldJob';
import { StepFrame } from '../step/StepFrame';
import { useAnswer } from '../step/useAnswer';
import { SaveButton } from './SaveButton';
import type { StepOf } from './StepAnswer';

/** Taking off one's own lock, with one's own PIN. */
export function LockOffAnswer({ step }: { step: StepOf<'lock-off'> }) {
  const { t } = useWords();
  const { state, me } = useFieldJob();
  const { act, saving, failed } = useAnswer(step);
  const { isolator } = step.ask;
  const own = ownLocks(state, me.person).find((each) => each.isolator === isolator);
  return (
    <StepFrame
      step={step}
      failed={failed}
      answer={
        <p className="m-0">
          {own ? (
            <>
              {t('field.lockOff.yours')} <LockBox isolator={isolator} lock={own.lock} />
            </>
          ) : (
            t('field.lockOff.none', { isolator })
          )}
        </p>
      }
      primary={
        own && (
          <SaveButton
            saving={saving}
            onSave={() =>
              act(
                'lock-off',
                { isolator, lock: own.lock, step: step.id },
                t('field.lockOff.pin', { lock: own.lock, isolator }),
              )
            }
          >
            {t('field.lockOff.save', { lock: own.lock, isolator })}
          </SaveButton>
        )
      }
    />
  );
}
