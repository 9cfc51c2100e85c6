import { useState } from 'react';
import { FieldButton } from '../../../components/field/FieldButton';
import { oneLine } from '../../../components/field/oneLine';
import { Sheet } from '../../../components/field/Sheet';
import { WordsBox } from '../../../components/field/WordsBox';
import { useWords } from '../../../components/words';
import { NotSaved } from '../job/NotSaved';
import { useSave } from '../job/useSave';

/** A note on the job, for whoever comes next and for the record. */
export function NoteSheet({ onClose }: { onClose: () => void }) {
  const { t } = useWords();
  const { save, saving, failed } = useSave();
  const [words, setWords] = useState('');
  async function keep() {
    if (await save('note', { words: oneLine(words) })) onClose();
  }
  return (
    <Sheet
      title={t('field.more.note')}
      onClose={onClose}
      closeWords={t('field.cancel')}
      actions={
        <FieldButton look="primary" disabled={!oneLine(words) || saving} onClick={() => void keep()}>
          {t('field.save')}
        </FieldButton>
      }
    >
      <WordsBox label={t('field.note.words')} value={words} rows={5} onChange={setWords} />
      <NotSaved code={failed} />
    </Sheet>
  );
}
