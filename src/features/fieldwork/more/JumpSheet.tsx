import { useState } from 'react';
import { LineBox } from '../../../components/field/LineBox';
import { Sheet } from '../../../components/field/Sheet';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import { StepLinks } from './StepLinks';
import { stepsAt } from './stepsAt';

// More than a screenful helps nobody: type one more character instead.
const shownSteps = 20;

/** Jump to terminal: type the number in front of you. */
export function JumpSheet({ onClose }: { onClose: () => void }) {
  const { t } = useWords();
  const { pack } = useFieldJob();
  const [typed, setTyped] = useState('');
  const found = stepsAt(pack, typed);
  return (
    <Sheet title={t('field.more.jump')} onClose={onClose}>
      <LineBox label={t('field.jump.type')} value={typed} onChange={setTyped} maxLength={60} />
      <p role="status" className="m-0">
        {typed && t('field.jump.found', { n: found.length })}
      </p>
      <StepLinks steps={found.slice(0, shownSteps)} onOpen={onClose} />
    </Sheet>
  );
}
