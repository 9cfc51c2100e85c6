import { useId } from 'react';

interface RadioListProps<T extends string> {
  legend: string;
  options: readonly { value: T; label: string }[];
  chosen: T | undefined;
  onChoose: (value: T) => void;
}

/** One of a few, each a row a glove can hit. */
export function RadioList<T extends string>({ legend, options, chosen, onChoose }: RadioListProps<T>) {
  const name = useId();
  return (
    <fieldset className="m-0 grid gap-2 border-0 p-0">
      <legend className="mb-1 p-0">{legend}</legend>
      {options.map(({ value, label }) => (
        <label
          key={value}
          className={`flex min-h-[3.5rem] cursor-pointer items-center gap-3 border-2 bg-sheet px-3 py-1 leading-tight has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-offset-2 has-[:focus-visible]:outline-ink ${
            value === chosen ? 'border-ink font-bold shadow-[inset_8px_0_0_var(--ink)]' : 'border-edge'
          }`}
        >
          <input
            type="radio"
            name={name}
            value={value}
            checked={value === chosen}
            onChange={() => {
              onChoose(value);
            }}
            className="h-6 w-6 shrink-0 accent-ink"
          />
          {label}
        </label>
      ))}
    </fieldset>
  );
}
