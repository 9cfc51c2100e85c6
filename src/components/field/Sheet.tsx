import { useEffect, useId, useRef, type ReactNode } from 'react';
import { useWords } from '../words';
import { FieldButton } from './FieldButton';

interface SheetProps {
  title: string;
  onClose: () => void;
  children: ReactNode;
  /** Big buttons at the bottom; *Close* always stands below them. */
  actions?: ReactNode;
  closeWords?: string;
}

/** A question over the step, on the browser's own dialog: focus stays inside and is given back. */
export function Sheet({ title, onClose, children, actions, closeWords }: SheetProps) {
  const { t } = useWords();
  const titleId = useId();
  const element = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const dialog = element.current;
    dialog?.showModal();
    return () => dialog?.close();
  }, []);
  return (
    <dialog
      ref={element}
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      className="mx-auto mt-auto mb-0 max-h-[92dvh] w-[min(40rem,100vw)] max-w-none overflow-auto border-2 border-ink bg-sheet p-0 text-[1.125rem] text-ink backdrop:bg-black/55"
    >
      <h2
        id={titleId}
        className="m-0 border-b-2 border-ink px-4 py-2.5 text-[1.3rem] leading-tight font-bold"
      >
        {title}
      </h2>
      <div className="grid gap-3 px-4 py-3">{children}</div>
      <div className="sticky bottom-0 grid gap-2 border-t-2 border-ink bg-sheet px-3 py-2.5">
        {actions}
        <FieldButton onClick={onClose}>{closeWords ?? t('field.close')}</FieldButton>
      </div>
    </dialog>
  );
}
