import { useWords } from '../words';
import { padPress, type PadKey } from './padPress';

interface NumberPadProps {
  value: string;
  onChange: (value: string) => void;
  /** Offers the decimal point. */
  decimal?: boolean;
  /** Offers the minus sign, for quantities that have a direction. */
  minus?: boolean;
  disabled?: boolean;
  /** Says the value and its unit aloud as it grows. */
  words: string;
}

const digits: PadKey[] = ['1', '2', '3', '4', '5', '6', '7', '8', '9'];
const keyClass =
  'min-h-[3.5rem] cursor-pointer rounded-[2px] border border-edge bg-sheet text-[1.35rem] leading-none font-bold text-ink active:bg-ink active:text-paper disabled:text-muted';

/** Our own pad: the phone's keyboard hides half the screen and has no minus on some phones. Typing works as well. */
export function NumberPad({
  value,
  onChange,
  decimal = true,
  minus = false,
  disabled,
  words,
}: NumberPadProps) {
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
  return (
    <div role="group" aria-label={words} className="grid grid-cols-12 gap-2">
      {digits.map((digit) => key(digit, digit, 'col-span-4'))}
      {minus && key('-', '−', 'col-span-3')}
      {decimal && key('.', '.', minus ? 'col-span-3' : 'col-span-4')}
      {key('0', '0', minus ? 'col-span-3' : decimal ? 'col-span-4' : 'col-span-6')}
      {key(
        'wipe',
        t('field.pad.wipe'),
        `${minus ? 'col-span-3' : decimal ? 'col-span-4' : 'col-span-6'} text-[1rem]!`,
      )}
    </div>
  );
}
