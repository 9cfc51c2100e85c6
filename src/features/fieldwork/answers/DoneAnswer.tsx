import { MarkedText } from '../../../components/field/MarkedText';
import { useFieldJob } from '../job/useFieldJob';
import { StepFrame } from '../step/StepFrame';
import { useAnswer } from '../step/useAnswer';
import { SaveButton } from './SaveButton';
import type { StepOf } from './StepAnswer';

/** One thing to do; the button says what was done. */
export function DoneAnswer({ step }: { step: StepOf<'done'> }) {
  const { marked } = useFieldJob();
  const { answer, saving, failed } = useAnswer(step);
  return (
    <StepFrame
      step={step}
      failed={failed}
      primary={
        <SaveButton saving={saving} onSave={() => answer({ kind: 'done' })}>
          <MarkedText text={marked(step.ask.label)} look="bold" />
        </SaveButton>
      }
    />
  );
}
