import type { ReactNode } from 'react';
import { useLocation } from 'react-router-dom';
import type { Step } from '../../../../shared/checklist/types';
import { ActionBar } from '../../../components/field/ActionBar';
import { FieldPage } from '../../../components/field/FieldPage';
import { useWords } from '../../../components/words';
import { JobHeader } from '../job/JobHeader';
import { NotSaved } from '../job/NotSaved';
import { OwnLocksLine } from '../job/OwnLocksLine';
import type { Save } from '../job/useSave';
import { UnsentLine } from '../layout/UnsentLine';
import { StepActions } from './StepActions';
import { StepWords } from './StepWords';

interface StepFrameProps {
  step: Step;
  failed?: Save['failed'];
  /** Goes between the words and the bottom: the pad, the choices. */
  answer?: ReactNode;
  primary?: ReactNode;
}

/** The page around every answer: title block, stages, words and picture, what is saved, and the buttons that never change. */
export function StepFrame({ step, failed, answer, primary }: StepFrameProps) {
  const { t } = useWords();
  const { state } = useLocation() as { state: { saved?: string } | null };
  return (
    <FieldPage
      header={<JobHeader stage={step.stage} />}
      banner={
        <>
          {(step.needsIsolation || step.stage === 'prove-dead') && <OwnLocksLine />}
          <UnsentLine saved={state?.saved ? t('field.saved') : undefined} />
        </>
      }
      answer={
        (answer ?? failed) && (
          <>
            {answer}
            <NotSaved code={failed} />
          </>
        )
      }
      footer={
        <ActionBar primary={primary}>
          <StepActions step={step} undo={state?.saved} />
        </ActionBar>
      }
    >
      <StepWords step={step} />
    </FieldPage>
  );
}
