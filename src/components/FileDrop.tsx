import { useId, useState, type DragEvent } from 'react';
import { buttonClass } from './buttonClass';
import { useWords } from './words';

interface FileDropProps {
  label: string;
  hint: string;
  accept: string;
  busy?: boolean;
  onFile: (file: File) => void;
}

/** One file, dropped or chosen. The browser's file input stays the control for keyboard and screen reader; its own words, which follow the browser's language, are not shown. */
export function FileDrop({ label, hint, accept, busy = false, onFile }: FileDropProps) {
  const { t } = useWords();
  const id = useId();
  const [over, setOver] = useState(false);
  const take = (files: FileList | null) => {
    const file = files?.[0];
    if (file && !busy) onFile(file);
  };
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    take(event.dataTransfer.files);
  };
  return (
    <div
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={drop}
      className={`relative my-3 max-w-[44rem] border-2 border-dashed px-5 py-4 ${over ? 'border-ink bg-paper' : 'border-edge'}`}
    >
      <p id={`${id}-label`} className="m-0 font-bold">
        {label}
      </p>
      <p id={`${id}-hint`} className="m-0 mb-2 text-sm text-muted">
        {hint}
      </p>
      <input
        id={id}
        type="file"
        accept={accept}
        disabled={busy}
        aria-labelledby={`${id}-label`}
        aria-describedby={`${id}-hint`}
        className="peer sr-only"
        onChange={(event) => {
          take(event.target.files);
          // The same file, mended and chosen again, must count as a change.
          event.target.value = '';
        }}
      />
      <label
        htmlFor={id}
        className={buttonClass(
          'outlined',
          'peer-focus-visible:outline-3 peer-focus-visible:outline-offset-2 peer-focus-visible:outline-ink peer-disabled:cursor-not-allowed peer-disabled:border-edge peer-disabled:text-muted',
        )}
      >
        {t('app.chooseFile')}
      </label>
    </div>
  );
}
