import { useState } from 'react';
import type { Isolator } from '../../../../shared/panel/panelSchema';
import { FieldButton } from '../../../components/field/FieldButton';
import { LineBox } from '../../../components/field/LineBox';
import { oneLine } from '../../../components/field/oneLine';
import { Sheet } from '../../../components/field/Sheet';
import { TagBox } from '../../../components/field/TagBox';
import { useWords } from '../../../components/words';
import { NotSaved } from '../job/NotSaved';
import { useLockElsewhere } from '../locks/useLockElsewhere';
import { useSave } from '../job/useSave';

/** Go to the isolator that still feeds the terminal and put the own lock on it. The red screen stays: only a reading lifts it. */
export function LiveLock({ isolator, onClose }: { isolator: Isolator; onClose: () => void }) {
  const { t } = useWords();
  const { save, saving, failed } = useSave();
  const [typed, setTyped] = useState('');
  const lock = oneLine(typed);
  const elsewhere = useLockElsewhere(lock);
  async function keep() {
    if (await save('lock-on', { isolator: isolator.tag, lock })) onClose();
  }
  return (
    <Sheet
      title={t('field.live.goLock', { isolator: isolator.tag })}
      onClose={onClose}
      closeWords={t('field.cancel')}
      actions={
        <FieldButton
          look="primary"
          disabled={!lock || Boolean(elsewhere) || saving}
          onClick={() => void keep()}
        >
          {lock ? t('field.lockOn.save', { lock, isolator: isolator.tag }) : t('field.lockOn.type')}
        </FieldButton>
      }
    >
      <p className="m-0">
        <TagBox>{isolator.tag}</TagBox> {isolator.location}
      </p>
      {isolator.alsoFeeds && isolator.alsoFeeds.length > 0 && (
        <p className="m-0 font-bold">{t('field.live.alsoFeeds', { list: isolator.alsoFeeds.join(', ') })}</p>
      )}
      <p className="m-0">{t('field.live.openLock')}</p>
      <LineBox
        label={t('field.lockOn.number')}
        value={typed}
        inputMode="numeric"
        maxLength={40}
        onChange={setTyped}
        error={elsewhere && t('field.lockOn.elsewhere', { lock, isolator: elsewhere.isolator })}
      />
      <NotSaved code={failed} />
    </Sheet>
  );
}
