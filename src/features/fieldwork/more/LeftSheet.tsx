import { stages } from '../../../../shared/checklist/types';
import { Sheet } from '../../../components/field/Sheet';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { openSteps } from './openSteps';
import { StepLinks } from './StepLinks';

/** Mine, left: what still waits for this person, by stage. */
export function LeftSheet({ onClose }: { onClose: () => void }) {
  const { t } = useWords();
  const { pack, state, me } = useFieldJob();
  const left = openSteps(pack.checklist, state, me.person);
  return (
    <Sheet title={t('field.left.title', { n: left.length })} onClose={onClose}>
      {stages.map((stage) => {
        const steps = left.filter((step) => step.stage === stage);
        if (steps.length === 0) return null;
        return (
          <details key={stage} className="border-2 border-edge">
            <summary className="flex min-h-[3.5rem] cursor-pointer items-center px-3 font-bold">
              {t('field.left.stage', { stage: t(`field.stage.${stage}`), n: steps.length })}
            </summary>
            <div className="p-2">
              <StepLinks steps={steps} onOpen={onClose} />
            </div>
          </details>
        );
      })}
    </Sheet>
  );
}
