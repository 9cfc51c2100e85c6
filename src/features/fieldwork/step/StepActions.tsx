import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Step } from '../../../../shared/checklist/types';
import { paths } from '../../../app/paths';
import { FieldButton } from '../../../components/field/FieldButton';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { MoreButton } from '../more/MoreButton';
import { StopButton } from '../more/StopButton';
import { HoldSheet } from './HoldSheet';

/** Can't do this, back or undo, more, and stop work: in the same place on every step. */
export function StepActions({ step, undo }: { step: Step; undo?: string | undefined }) {
  const { t } = useWords();
  const navigate = useNavigate();
  const { pack } = useFieldJob();
  const [holding, setHolding] = useState(false);
  const back = () => {
    // Undo goes to the step just answered, for a new answer that replaces the mis-tap.
    if (undo) void navigate(paths.step(pack.job.id, undo), { replace: true });
    else if (window.history.length > 1) void navigate(-1);
    else void navigate(paths.myJob(pack.job.id));
  };
  return (
    <>
      <FieldButton
        onClick={() => {
          setHolding(true);
        }}
      >
        {t('field.hold.cant')}
      </FieldButton>
      <FieldButton onClick={back}>{t(undo ? 'field.undo' : 'field.back')}</FieldButton>
      <MoreButton step={step} />
      <StopButton pack={pack} />
      {holding && (
        <HoldSheet
          step={step}
          onClose={() => {
            setHolding(false);
          }}
        />
      )}
    </>
  );
}
