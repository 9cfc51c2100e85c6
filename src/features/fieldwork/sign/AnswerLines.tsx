import type { StepState } from '../../../../shared/job/types';
import { clockWords } from '../../../components/field/clockWords';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { answerWords } from '../step/answerWords';

/** Every answer a step ever had, oldest first, with who and when. */
export function AnswerLines({ stepState }: { stepState: StepState }) {
  const { t, language } = useWords();
  const { nameOf, plain } = useFieldJob();
  const { step, history } = stepState;
  return history.map(({ entry, value, person, at, verdict }) => (
    <p key={entry} className="m-0 leading-snug">
      {t('field.summary.history', {
        answer: answerWords(step, value, t, plain),
        name: nameOf(person),
        at: clockWords(at, language, new Date()),
      })}
      {verdict !== 'ok' && <b> {t(verdict === 'out' ? 'field.summary.out' : 'field.summary.refused')}</b>}
    </p>
  ));
}
