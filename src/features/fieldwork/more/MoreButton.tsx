import { useState } from 'react';
import type { Step } from '../../../../shared/checklist/types';
import { FieldButton } from '../../../components/field/FieldButton';
import { useWords } from '../../../components/words';
import { MoreSheet } from './MoreSheet';

/** Everything that is not the next answer. */
export function MoreButton({ step }: { step?: Step }) {
  const { t } = useWords();
  const [open, setOpen] = useState(false);
  return (
    <>
      <FieldButton
        onClick={() => {
          setOpen(true);
        }}
      >
        {t('field.more')}
      </FieldButton>
      {open && (
        <MoreSheet
          step={step}
          onClose={() => {
            setOpen(false);
          }}
        />
      )}
    </>
  );
}
