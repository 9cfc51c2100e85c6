import { useState } from 'react';
import type { Step } from '../../../../shared/checklist/types';
import { FieldButton } from '../../../components/field/FieldButton';
import { oneLine } from '../../../components/field/oneLine';
import { Sheet } from '../../../components/field/Sheet';
import { WordsBox } from '../../../components/field/WordsBox';
import { useWords } from '../../../components/words';
import { NotSaved } from '../job/NotSaved';
import { useSave } from '../job/useSave';

/** Drawing differs: what the drawing says wrongly, and what is there. The engineer hears of it; the step stays as it is. */
export function DiffersSheet({ step, onClose }: { step: Step | undefined; onClose: () => void }) {
  const { t } = useWords();
  const { save, saving, failed } = useSave();
  const [found, setFound] = useState('');
  const [proposed, setProposed] = useState('');
  const better = oneLine(proposed);
  async function keep() {
    const body = {
      says: oneLine(found),
      ...(step ? { step: step.id } : {}),
      ...(better ? { proposed: better } : {}),
    };
    if (await save('drawing-differs', body)) onClose();
  }
  return (
    <Sheet
      title={t('field.more.differs')}
      onClose={onClose}
      closeWords={t('field.cancel')}
      actions={
        <FieldButton look="primary" disabled={!oneLine(found) || saving} onClick={() => void keep()}>
          {t('field.save')}
        </FieldButton>
      }
    >
      <WordsBox label={t('field.differs.found')} value={found} onChange={setFound} />
      <WordsBox label={t('field.differs.proposed')} value={proposed} onChange={setProposed} />
      <p className="m-0 text-[0.95rem]">{t('field.differs.hold')}</p>
      <NotSaved code={failed} />
    </Sheet>
  );
}
