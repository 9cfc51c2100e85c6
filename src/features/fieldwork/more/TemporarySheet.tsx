import { useState } from 'react';
import type { BodyOf } from '../../../../shared/job/entry';
import { FieldButton } from '../../../components/field/FieldButton';
import { oneLine } from '../../../components/field/oneLine';
import { RadioList } from '../../../components/field/RadioList';
import { LineBox } from '../../../components/field/LineBox';
import { Sheet } from '../../../components/field/Sheet';
import { useWords } from '../../../components/words';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';
import { useSave } from '../job/useSave';

type What = BodyOf<'temporary'>['what'];
const kinds: readonly What[] = ['wire-lifted', 'jumper', 'earth'];

/** What is lifted or fitted for a while: entered when made, entered again when put right. */
export function TemporarySheet({ onClose }: { onClose: () => void }) {
  const { t } = useWords();
  const { state } = useFieldJob();
  const { save, saving, failed } = useSave();
  const [what, setWhat] = useState<What>();
  const [place, setPlace] = useState('');
  const open = state.temporaries.filter(({ removedBy, body }) => !removedBy && !body.removes);
  async function add() {
    if (what && (await save('temporary', { what, place: oneLine(place) }))) onClose();
  }
  return (
    <Sheet
      title={t('field.more.temporary')}
      onClose={onClose}
      actions={
        <FieldButton look="primary" disabled={!what || !oneLine(place) || saving} onClick={() => void add()}>
          {t('field.temporary.add')}
        </FieldButton>
      }
    >
      {open.map(({ entry, body }) => (
        <div key={entry} className="grid gap-1 border-2 border-ink p-2">
          <p className="m-0">
            <b>{t(`field.temporary.${body.what}`)}</b> {body.place}
          </p>
          <FieldButton
            disabled={saving}
            onClick={() => void save('temporary', { what: body.what, place: body.place, removes: entry })}
          >
            {t('field.temporary.undone')}
          </FieldButton>
        </div>
      ))}
      <RadioList
        legend={t('field.temporary.what')}
        options={kinds.map((value) => ({ value, label: t(`field.temporary.${value}`) }))}
        chosen={what}
        onChoose={setWhat}
      />
      <LineBox label={t('field.temporary.place')} value={place} maxLength={200} onChange={setPlace} />
      <NotSaved code={failed} />
    </Sheet>
  );
}
