import { useState } from 'react';
import type { Pack } from '../../../../shared/api/jobs';
import { fieldButtonClass } from '../../../components/field/fieldButtonClass';
import { useWords } from '../../../components/words';
import { StopSheet } from './StopSheet';

/** *Stop work*: an octagon and a word, in the same corner of every field screen. */
export function StopButton({ pack }: { pack: Pack }) {
  const { t } = useWords();
  const [open, setOpen] = useState(false);
  return (
    <>
      <button
        type="button"
        aria-label={t('field.stop.title')}
        className={fieldButtonClass('outlined', 'flex-col gap-0.5! px-1!')}
        onClick={() => {
          setOpen(true);
        }}
      >
        <svg viewBox="0 0 24 24" className="h-5 w-5 text-danger" aria-hidden="true">
          <path d="M7.5 1h9L23 7.5v9L16.5 23h-9L1 16.5v-9z" fill="currentColor" />
          <path d="M6.5 12h11" stroke="#ffffff" strokeWidth="3" />
        </svg>
        {t('field.stop.short')}
      </button>
      {open && (
        <StopSheet
          pack={pack}
          onClose={() => {
            setOpen(false);
          }}
        />
      )}
    </>
  );
}
