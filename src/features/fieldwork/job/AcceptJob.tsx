import { useWords } from '../../../components/words';
import { SaveButton } from '../answers/SaveButton';
import { NotSaved } from './NotSaved';
import { useSave } from './useSave';

/** Accepting comes first: nothing of the checklist opens before. */
export function AcceptJob() {
  const { t } = useWords();
  const { save, saving, failed } = useSave();
  return (
    <>
      <NotSaved code={failed} />
      <SaveButton saving={saving} onSave={() => save('accepted', {})}>
        {t('field.job.accept')}
      </SaveButton>
    </>
  );
}
