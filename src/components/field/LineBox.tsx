import { useId, type ComponentProps } from 'react';

interface LineBoxProps extends Omit<ComponentProps<'input'>, 'onChange' | 'value'> {
  label: string;
  value: string;
  onChange: (value: string) => void;
  error?: string;
}

/** One line to type: a tag, a lock number, a meter number. Monospaced, so that 0 and O stay apart. */
export function LineBox({ label, value, onChange, error, className = '', ...rest }: LineBoxProps) {
  const id = useId();
  return (
    <div className="grid gap-1">
      <label htmlFor={id}>{label}</label>
      <input
        autoComplete="off"
        autoCapitalize="characters"
        spellCheck={false}
        {...rest}
        id={id}
        value={value}
        aria-invalid={Boolean(error)}
        aria-describedby={error ? `${id}-error` : undefined}
        onChange={(event) => {
          onChange(event.target.value);
        }}
        className={`min-h-[3.5rem] w-full border-[3px] border-ink bg-sheet px-3 font-mono text-[1.5rem] text-ink ${className}`}
      />
      <p id={`${id}-error`} role="alert" className="m-0 font-bold empty:hidden">
        {error}
      </p>
    </div>
  );
}
