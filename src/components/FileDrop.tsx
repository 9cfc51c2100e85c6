import { useId, useState, type DragEvent } from 'react';

interface FileDropProps {
  label: string;
  hint: string;
  accept: string;
  busy?: boolean;
  onFile: (file: File) => void;
}

/** One file, dropped or chosen. The file input itself stays the control: keyboard and screen reader need nothing else. */
export function FileDrop({ label, hint, accept, busy = false, onFile }: FileDropProps) {
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
      className={`my-3 max-w-[44rem] border-2 border-dashed px-5 py-4 ${over ? 'border-ink bg-paper' : 'border-edge'}`}
    >
      <label htmlFor={id} className="block font-bold">
        {label}
      </label>
      <p id={`${id}-hint`} className="m-0 mb-2 text-sm text-muted">
        {hint}
      </p>
      <input
        id={id}
        type="file"
        accept={accept}
        disabled={busy}
        aria-describedby={`${id}-hint`}
        className="max-w-full min-h-11 cursor-pointer file:mr-3 file:min-h-11 file:cursor-pointer file:rounded-[3px] file:border-2 file:border-solid file:border-ink file:bg-sheet file:px-4 file:font-bold file:text-ink"
        onChange={(event) => {
          take(event.target.files);
          // The same file, mended and chosen again, must count as a change.
          event.target.value = '';
        }}
      />
    </div>
  );
}
