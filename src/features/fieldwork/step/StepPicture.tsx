import { lazy, Suspense } from 'react';
import type { Step } from '../../../../shared/checklist/types';
import { useWords } from '../../../components/words';
import { LoopDiagram } from '../../../diagrams/LoopDiagram';
import { useFieldJob } from '../job/useFieldJob';
import { LocksPicture } from '../locks/LocksPicture';

const Summary = lazy(async () => ({ default: (await import('../sign/Summary')).Summary }));

/** The computed picture of a step: the loop of its point with the conductor in question thick, the isolators in order, or what is to be signed. */
export function StepPicture({ step }: { step: Step }) {
  const { t } = useWords();
  const { pack } = useFieldJob();
  if (step.stage === 'sign')
    return (
      <Suspense>
        <Summary />
      </Suspense>
    );
  if (!step.picture) return null;
  if (step.picture.kind === 'energy') return <LocksPicture isolator={step.where?.isolator} />;
  const { point, mark } = step.picture;
  const loop = <LoopDiagram panel={pack.panel} point={point} {...(mark === undefined ? {} : { mark })} />;
  if (step.ask.kind !== 'reading') return loop;
  // The pad needs the room: half a picture above the box would be read as a value or a target.
  return (
    <details className="border-2 border-edge">
      <summary className="flex min-h-[3.5rem] cursor-pointer items-center px-3 font-bold">
        {t('field.picture.show')}
      </summary>
      {loop}
    </details>
  );
}
