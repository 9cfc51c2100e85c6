import { useId } from 'react';

interface PinFieldProps {
  label: string;
  value: string;
  onChange: (value: string) => void;
  error: string | undefined;
}

/** Digits only, hidden as they are typed. */
export function PinField({ label, value, onChange, error }: PinFieldProps) {
  const id = useId();
  return (
    <div className="grid gap-1">
      <label htmlFor={id}>{label}</label>
      <input
        id={id}
        type="password"
        inputMode="numeric"
        autoComplete="new-password"
        value={value}
        aria-invalid={Boolean(error)}
        aria-describedby={`${id}-error`}
        onChange={(event) => {
          onChange(event.target.value.replace(/\D/g, '').slice(0, 12));
        }}
        className="min-h-[3.5rem] w-full border-[3px] border-ink bg-sheet px-3 font-mono text-[1.6rem] tracking-[0.3em] text-ink"
      />
      <p id={`${id}-error`} role="alert" className="m-0 font-bold empty:hidden">
        {error}
      </p>
    </div>
  );
}
