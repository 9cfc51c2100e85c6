import { useParams } from 'react-router-dom';
import { useWakeLock } from '../../../components/field/useWakeLock';
import { useFieldJob } from '../job/useFieldJob';
import { StepAnswer } from '../answers/StepAnswer';
import { BreakCheck } from './BreakCheck';
import { StepMissing } from './StepMissing';

/** One step: what to do, its picture, the answer under the thumb. */
export function StepPage() {
  const { step: id = '' } = useParams();
  const { stepOf } = useFieldJob();
  const step = stepOf(id);
  useWakeLock(step?.stage === 'prove-dead' || step?.stage === 'prove-points');
  if (!step) return <StepMissing />;
  return (
    <>
      <StepAnswer key={step.id} step={step} />
      <BreakCheck stage={step.stage} />
    </>
  );
}
