import { useRef, useEffect } from 'react';
import { useWords } from '../words';
import { padPress, type PadKey } from './padPress';

interface ReadingBoxProps {
  id: string;
  label: string;
  value: string;
  unit: string;
  describedBy?: string;
  invalid?: boolean;
  /** Offers the change of sign, for quantities that have a direction. */
  minus?: boolean;
  onChange: (value: string) => void;
  onEnter: () => void;
}

const padKeys: Record<string, PadKey> = { ',': '.', '.': '.', '-': '-', Backspace: 'back', Delete: 'wipe' };

/** The reading as it is being entered, big, with its unit. A real field, so a hardware keyboard and a screen reader work. */
export function ReadingBox({
  id,
  label,
  value,
  unit,
  describedBy,
  invalid,
  minus = false,
  onChange,
  onEnter,
}: ReadingBoxProps) {
  const { t } = useWords();
  const field = useRef<HTMLInputElement>(null);
  // Our own pad does the typing: the phone's keyboard stays down.
  useEffect(() => {
    field.current?.setAttribute('virtualkeyboardpolicy', 'manual');
  }, []);
  return (
    <div className="flex items-center border-[3px] border-ink bg-sheet px-3.5 has-[input:focus-visible]:outline-3 has-[input:focus-visible]:outline-offset-2 has-[input:focus-visible]:outline-ink">
      {minus && (
        <button
          type="button"
          aria-label={t('field.pad.minus')}
          className="-ml-3.5 mr-3 min-h-[3.5rem] min-w-[3.5rem] cursor-pointer self-stretch border-0 border-r-2 border-edge bg-sheet text-[1.35rem] font-bold text-ink active:bg-ink active:text-paper"
          onClick={() => {
            onChange(padPress(value, '-'));
          }}
        >
          ±
        </button>
      )}
      <input
        ref={field}
        id={id}
        aria-label={label}
        aria-describedby={describedBy}
        aria-invalid={invalid}
        inputMode="none"
        autoComplete="off"
        value={value.replace('-', '−')}
        onChange={() => undefined}
        onKeyDown={(event) => {
          if (event.key === 'Enter') return onEnter();
          const key = padKeys[event.key] ?? (/^\d$/.test(event.key) ? (event.key as PadKey) : undefined);
          if (!key || event.ctrlKey || event.metaKey) return;
          event.preventDefault();
          onChange(padPress(value, key));
        }}
        className="min-h-[3.5rem] w-full min-w-0 border-0 bg-transparent p-0 font-mono text-[2.4rem] leading-none font-semibold text-ink outline-none"
      />
      <span className="shrink-0 pl-3 text-[1.2rem]">{unit}</span>
    </div>
  );
}
