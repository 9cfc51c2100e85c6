import { FieldButton } from '../../../components/field/FieldButton';
import { useWords } from '../../../components/words';
import { NotSaved } from './NotSaved';
import { useSave } from './useSave';

/** Accepting comes first: nothing of the checklist opens before. */
export function AcceptJob() {
  const { t } = useWords();
  const { save, saving, failed } = useSave();
  return (
    <>
      <NotSaved code={failed} />
      <FieldButton
        look="primary"
        className="min-h-[3.75rem] text-[1.2rem]"
        disabled={saving}
        onClick={() => void save('accepted', {})}
      >
        {t('field.job.accept')}
      </FieldButton>
    </>
  );
}
