import type { ReactNode } from 'react';
import { FieldButton } from '../../../components/field/FieldButton';

interface SaveButtonProps {
  saving: boolean;
  disabled?: boolean;
  onSave: () => Promise<unknown>;
  children: ReactNode;
}

/** The primary answer. It stays in place while the store works, so that a second tap hits nothing else. */
export function SaveButton({ saving, disabled = false, onSave, children }: SaveButtonProps) {
  return (
    <FieldButton
      look="primary"
      className="min-h-[3.75rem] text-[1.2rem]"
      disabled={disabled}
      aria-busy={saving}
      onClick={(event) => {
        // The second tap of a double tap would answer the step that comes next in the same place.
        if (event.detail < 2) void onSave();
      }}
    >
      <span>{children}</span>
    </FieldButton>
  );
}
