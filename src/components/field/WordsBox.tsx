import { useId } from 'react';

interface WordsBoxProps {
  label: string;
  value: string;
  onChange: (value: string) => void;
  maxLength?: number;
  rows?: number;
  error?: string;
}

/** A few words in a person's own language. */
export function WordsBox({ label, value, onChange, maxLength = 2000, rows = 3, error }: WordsBoxProps) {
  const id = useId();
  return (
    <div className="grid gap-1">
      <label htmlFor={id}>{label}</label>
      <textarea
        id={id}
        rows={rows}
        maxLength={maxLength}
        value={value}
        aria-invalid={Boolean(error)}
        aria-describedby={error ? `${id}-error` : undefined}
        onChange={(event) => {
          onChange(event.target.value);
        }}
        className="w-full border-2 border-edge bg-sheet px-3 py-2 text-ink"
      />
      {error && (
        <p id={`${id}-error`} className="m-0 font-bold">
          {error}
        </p>
      )}
    </div>
  );
}
