import { useEffect, useId, useRef, type ReactNode } from 'react';
import { Button } from './Button';
import { useWords } from './words';

interface DialogProps {
  open: boolean;
  title: string;
  onClose: () => void;
  /** The buttons that act; closing without acting is always offered beside them. */
  actions?: ReactNode;
  closeWords?: string;
  children: ReactNode;
}

/** A question over the page, on the browser's own dialog: focus is kept inside and given back, Escape closes. */
export function Dialog({ open, title, onClose, actions, closeWords, children }: DialogProps) {
  const { t } = useWords();
  const titleId = useId();
  const element = useRef<HTMLDialogElement>(null);
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    const dialog = element.current;
    if (!dialog || !open) return;
    dialog.showModal();
    // The title first: a field further down would scroll past what has to be read before it.
    heading.current?.focus();
    return () => dialog.close();
  }, [open]);
  if (!open) return null;
  return (
    <dialog
      ref={element}
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      className="m-auto max-h-[90dvh] w-[min(44rem,calc(100vw-1rem))] overflow-auto border-2 border-ink bg-sheet p-0 text-ink backdrop:bg-ink/50"
    >
      <h2
        ref={heading}
        tabIndex={-1}
        id={titleId}
        className="m-0 outline-none border-b-2 border-ink px-5 py-3 text-xl font-bold"
      >
        {title}
      </h2>
      <div className="px-5 py-4">{children}</div>
      <div className="sticky bottom-0 flex flex-wrap justify-end gap-3 border-t border-rule bg-sheet px-5 py-3">
        <Button onClick={onClose}>{closeWords ?? t('app.close')}</Button>
        {actions}
      </div>
    </dialog>
  );
}
