import { clockWords } from '../../../components/field/clockWords';
import { useWords } from '../../../components/words';
import { answerWords } from '../step/answerWords';
import { useFieldJob } from '../job/useFieldJob';
import { ownLocks } from '../job/ownLocks';
import { lastDeadReading } from './lastDeadReading';

/** "Your lock 17 on Q1, 09:14. You measured 0.0 V, 09:31.": facts of this person, never a verdict on another's word. */
export function OwnProof() {
  const { t, language } = useWords();
  const { pack, local, state, me, plain } = useFieldJob();
  const at = (time: string) => clockWords(time, language, new Date());
  const locks = ownLocks(state, me.person);
  const reading = lastDeadReading(pack.checklist, local, state, me.person);
  return (
    <div className="border-l-8 border-ink bg-sheet px-3 py-2 leading-snug">
      {locks.length === 0 && <p className="m-0 font-bold">{t('field.locks.noneYours')}</p>}
      {locks.map(({ entry, isolator, lock, onAt }) => (
        <p key={entry} className="m-0">
          {t('field.locks.yourLock', { lock, isolator, at: at(onAt) })}
        </p>
      ))}
      {reading && (
        <p className="m-0">
          {t('field.locks.measured', {
            reading: answerWords(reading.step, reading.answer.value, t, plain),
            at: at(reading.answer.at),
          })}
        </p>
      )}
    </div>
  );
}
