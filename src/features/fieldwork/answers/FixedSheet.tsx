import { useState } from 'react';
import type { Step } from '../../../../shared/checklist/types';
import { FieldButton } from '../../../components/field/FieldButton';
import { oneLine } from '../../../components/field/oneLine';
import { Sheet } from '../../../components/field/Sheet';
import { WordsBox } from '../../../components/field/WordsBox';
import { useWords } from '../../../components/words';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';
import { useSave } from '../job/useSave';

/** Fix and measure again: what was fixed goes on the record before the new answer. */
export function FixedSheet({
  step,
  onClose,
  onAgain,
}: {
  step: Step;
  onClose: () => void;
  onAgain: () => void;
}) {
  const { t } = useWords();
  const { plain } = useFieldJob();
  const { save, saving, failed } = useSave();
  const [words, setWords] = useState('');
  async function keep() {
    const note = t('field.fixed.note', { step: plain(step.title), words: oneLine(words) }).slice(0, 2000);
    if (await save('note', { words: note })) onAgain();
  }
  return (
    <Sheet
      title={t('field.out.fixed')}
      onClose={onClose}
      closeWords={t('field.cancel')}
      actions={
        <FieldButton look="primary" disabled={!oneLine(words) || saving} onClick={() => void keep()}>
          {t('field.fixed.save')}
        </FieldButton>
      }
    >
      <WordsBox label={t('field.fixed.what')} value={words} maxLength={1500} onChange={setWords} />
      <NotSaved code={failed} />
    </Sheet>
  );
}
