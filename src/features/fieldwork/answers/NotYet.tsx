import { useState } from 'react';
import type { Step } from '../../../../shared/checklist/types';
import type { Refusal } from '../../../../shared/job/types';
import { paths } from '../../../app/paths';
import { FieldButton, FieldLink } from '../../../components/field/FieldButton';
import { MarkedText } from '../../../components/field/MarkedText';
import { useWords } from '../../../components/words';
import { nextFor } from '../job/engine';
import { useFieldJob } from '../job/useFieldJob';
import { ClearList } from '../locks/ClearList';
import { StepFrame } from '../step/StepFrame';
import { RoundSheet } from './RoundSheet';

/** This step's gate is shut for this person: why, in words, and the way to what opens it. */
export function NotYet({ step, refusals }: { step: Step; refusals: Refusal[] }) {
  const { t } = useWords();
  const { pack, local, me, marked } = useFieldJob();
  const [opened, setOpened] = useState(false);
  const next = nextFor(local, me.person);
  // Work that comes back after Locks off starts with isolating again.
  const needsRound = refusals.some(({ code }) => code === 'isolation-over');
  return (
    <StepFrame
      step={step}
      answer={
        <>
          <div className="border-2 border-ink bg-sheet px-3 py-2">
            <p className="m-0 font-bold">{t('field.gate.notYet')}</p>
            <ul className="m-0 grid gap-1 pl-5">
              {refusals.map((refusal, index) => (
                <li key={index}>
                  <MarkedText text={marked(refusal.says)} look="bold" />
                </li>
              ))}
            </ul>
          </div>
          {step.ask.kind === 'close' && <ClearList />}
          {needsRound && (
            <FieldButton
              onClick={() => {
                setOpened(true);
              }}
            >
              {t('field.out.round')}
            </FieldButton>
          )}
          {opened && (
            <RoundSheet
              step={step}
              onClose={() => {
                setOpened(false);
              }}
            />
          )}
        </>
      }
      primary={
        <FieldLink
          look="primary"
          to={next && next.id !== step.id ? paths.step(pack.job.id, next.id) : paths.myJob(pack.job.id)}
        >
          {t(next && next.id !== step.id ? 'field.gate.next' : 'field.job.open')}
        </FieldLink>
      }
    />
  );
}
