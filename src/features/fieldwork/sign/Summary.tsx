import type { ReactNode } from 'react';
import { stages } from '../../../../shared/checklist/types';
import type { StepState } from '../../../../shared/job/types';
import { paths } from '../../../app/paths';
import { clockWords } from '../../../components/field/clockWords';
import { FieldLink } from '../../../components/field/FieldButton';
import { LockBox } from '../../../components/field/LockBox';
import { MarkedText } from '../../../components/field/MarkedText';
import { useWords } from '../../../components/words';
import { locksOn } from '../job/ownLocks';
import { useFieldJob } from '../job/useFieldJob';
import { AnswerLines } from './AnswerLines';
import { exceptions } from './exceptions';

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="grid gap-2 border-t-2 border-ink pt-2">
      <h2 className="m-0 text-[1.15rem] leading-tight font-bold">{title}</h2>
      {children}
    </section>
  );
}

interface StepRowProps {
  stepState: StepState;
  head?: string | undefined;
  /** What can be done with this step here: sending it back, for a foreman. */
  act?: ReactNode;
}

function StepRow({ stepState, head, act }: StepRowProps) {
  const { t } = useWords();
  const { pack, marked } = useFieldJob();
  const { step, hold, returned } = stepState;
  return (
    <li className="grid gap-1 border-2 border-ink bg-sheet p-2">
      {head && <p className="m-0 font-bold">{head}</p>}
      <p className="m-0 leading-snug">
        <MarkedText text={marked(step.title)} look="bold" />
      </p>
      <AnswerLines stepState={stepState} />
      {hold && <p className="m-0">{hold.body.words}</p>}
      {returned && <p className="m-0">{returned.words}</p>}
      <FieldLink look="quiet" to={paths.step(pack.job.id, step.id)}>
        {t('field.review.openStep')}
      </FieldLink>
      {act}
    </li>
  );
}

function Exceptions({ act }: { act: (step: string) => ReactNode }) {
  const { t } = useWords();
  const { pack, state, plain } = useFieldJob();
  const found = exceptions(pack.checklist, state);
  return (
    <Part title={t('field.summary.exceptions')}>
      {state.contradictions.map(({ code, entries, says }) => (
        <p key={`${code} ${entries.join()}`} className="m-0 font-bold">
          {t('field.summary.contradiction')}: {plain(says)}
        </p>
      ))}
      {state.drawingDiffers.map(({ entry, body }) => (
        <p key={entry} className="m-0">
          <b>{t('field.summary.differs')}:</b> {body.says} {body.proposed}
        </p>
      ))}
      {found.length === 0 && <p className="m-0">{t('field.summary.noExceptions')}</p>}
      <ul className="m-0 grid list-none gap-2 p-0">
        {found.map(({ stepState, kinds }) => (
          <StepRow
            key={stepState.step.id}
            stepState={stepState}
            head={kinds.map((kind) => t(`field.summary.${kind}`)).join(' · ')}
            act={act(stepState.step.id)}
          />
        ))}
      </ul>
    </Part>
  );
}

function Locks() {
  const { t } = useWords();
  const { state } = useFieldJob();
  const on = locksOn(state);
  return (
    <Part title={t('field.summary.locks')}>
      <p className="m-0 flex flex-wrap gap-2">
        {on.length === 0 ? t('field.summary.locksOff') : t('field.summary.locksOn', { list: '' })}
        {on.map(({ entry, isolator, lock }) => (
          <LockBox key={entry} isolator={isolator} lock={lock} />
        ))}
      </p>
    </Part>
  );
}

function Rounds() {
  const { t, language } = useWords();
  const { state, nameOf } = useFieldJob();
  if (state.rounds.length === 0) return null;
  return (
    <Part title={t('field.summary.rounds')}>
      {state.rounds.map(({ id, number, person, at, words }) => (
        <p key={id} className="m-0 leading-snug">
          {t('field.summary.round', {
            number,
            name: nameOf(person),
            at: clockWords(at, language, new Date()),
            words,
          })}
        </p>
      ))}
    </Part>
  );
}

function AllAnswers({ act }: { act: (step: string) => ReactNode }) {
  const { t } = useWords();
  const { pack, state } = useFieldJob();
  return (
    <Part title={t('field.summary.answers')}>
      {stages.map((stage) => {
        const steps = pack.checklist.steps.filter((step) => step.stage === stage);
        if (steps.length === 0) return null;
        return (
          <details key={stage} className="border-2 border-edge">
            <summary className="flex min-h-[3.5rem] cursor-pointer items-center px-3 font-bold">
              {t('field.left.stage', { stage: t(`field.stage.${stage}`), n: steps.length })}
            </summary>
            <ul className="m-0 grid list-none gap-2 p-2">
              {steps
                .flatMap(({ id }) => state.steps[id] ?? [])
                .map((stepState) => (
                  <StepRow key={stepState.step.id} stepState={stepState} act={act(stepState.step.id)} />
                ))}
            </ul>
          </details>
        );
      })}
    </Part>
  );
}

const noAct = () => null;

/** The one summary that is signed and countersigned: exceptions first, then locks, rounds and every answer. */
export function Summary({ act = noAct }: { act?: (step: string) => ReactNode }) {
  const { t } = useWords();
  const { pack } = useFieldJob();
  return (
    <>
      <p className="m-0">
        {t('field.summary.scope', { points: pack.checklist.scope.length, panel: pack.panel.tag })}
      </p>
      <Exceptions act={act} />
      <Locks />
      <Rounds />
      <AllAnswers act={act} />
    </>
  );
}
