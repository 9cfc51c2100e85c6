import type { Step } from '../../../../shared/checklist/types';
import { paths } from '../../../app/paths';
import { FieldLink } from '../../../components/field/FieldButton';
import { MarkedText } from '../../../components/field/MarkedText';
import { useFieldJob } from '../job/useFieldJob';

/** Steps as rows to tap. */
export function StepLinks({ steps, onOpen }: { steps: Step[]; onOpen?: () => void }) {
  const { pack, marked } = useFieldJob();
  return (
    <ul className="m-0 grid list-none gap-2 p-0">
      {steps.map((step) => (
        <li key={step.id} className="grid">
          <FieldLink
            to={paths.step(pack.job.id, step.id)}
            look="quiet"
            className="justify-start! text-left! font-normal!"
            onClick={onOpen}
          >
            <span>
              <MarkedText text={marked(step.title)} look="bold" />
            </span>
          </FieldLink>
        </li>
      ))}
    </ul>
  );
}
