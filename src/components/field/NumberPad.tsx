import { useWords } from '../words';
import { padPress, type PadKey } from './padPress';

interface NumberPadProps {
  value: string;
  onChange: (value: string) => void;
  /** Offers the decimal point. */
  decimal?: boolean;
  disabled?: boolean;
  /** Says the value and its unit aloud as it grows. */
  words: string;
}

const keyClass =
  'min-h-[3.5rem] cursor-pointer rounded-[2px] border border-edge bg-sheet text-[1.35rem] leading-none font-bold text-ink active:bg-ink active:text-paper disabled:text-muted';

/** Our own pad: the phone's keyboard hides half the screen and has no minus on some phones. Typing works as well. */
export function NumberPad({ value, onChange, decimal = true, disabled, words }: NumberPadProps) {
  const { t } = useWords();
  const key = (name: PadKey, says: string, className = '') => (
    <button
      key={name}
      type="button"
      disabled={disabled}
      className={`${keyClass} ${className}`}
      onClick={() => {
        onChange(padPress(value, name));
      }}
    >
      {says}
    </button>
  );
  // Three rows instead of four: instruction, limit and pad fit on a phone together.
  const rows: PadKey[][] = [
    ['1', '2', '3', 'wipe'],
    ['4', '5', '6', ...(decimal ? (['.'] as const) : [])],
    ['7', '8', '9', '0'],
  ];
  return (
    <div role="group" aria-label={words} className="grid grid-cols-4 gap-2">
      {rows
        .flat()
        .map((name) =>
          name === 'wipe'
            ? key(name, t('field.pad.wipe'), `text-[1rem]! ${decimal ? '' : 'row-span-2'}`)
            : key(name, name),
        )}
    </div>
  );
}
