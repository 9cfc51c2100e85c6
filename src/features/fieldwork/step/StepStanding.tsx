import type { ReactNode } from 'react';
import type { Step } from '../../../../shared/checklist/types';
import { clockWords } from '../../../components/field/clockWords';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { answerWords } from './answerWords';
import { ownAnswer } from './ownAnswer';

function Standing({ head, children }: { head: string; children: ReactNode }) {
  return (
    <div className="border-l-8 border-ink bg-sheet px-3 py-1.5 leading-snug">
      <b>{head}</b> {children}
    </div>
  );
}

/** What already stands on this step: an answer, a hold, words of the foreman, two answers. */
export function StepStanding({ step }: { step: Step }) {
  const { t, language } = useWords();
  const { state, me, nameOf, plain } = useFieldJob();
  const stepState = state.steps[step.id];
  const { status, answer } = ownAnswer(state, step, me.person);
  const at = (time: string) => clockWords(time, language, new Date());
  return (
    <>
      {stepState?.returned && (
        <Standing head={t('field.standing.returned')}>{stepState.returned.words}</Standing>
      )}
      {stepState?.hold && (
        <Standing
          head={t('field.standing.hold', { name: nameOf(stepState.hold.person), at: at(stepState.hold.at) })}
        >
          {stepState.hold.body.words}
          {stepState.hold.decided && (
            <>
              {' '}
              {t(`field.decision.${stepState.hold.decided.decision}`)}. {stepState.hold.decided.words}
            </>
          )}
        </Standing>
      )}
      {status === 'two-answers' && (
        <Standing head={t('field.standing.two')}>{t('field.standing.twoWhat')}</Standing>
      )}
      {answer && status !== 'out' && (
        <Standing head={t('field.standing.answered', { name: nameOf(answer.person), at: at(answer.at) })}>
          {answerWords(step, answer.value, t, plain)}. {t('field.standing.again')}
        </Standing>
      )}
    </>
  );
}
