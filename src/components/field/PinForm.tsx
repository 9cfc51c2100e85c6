import { useEffect, useId, useState, type SubmitEvent } from 'react';
import { useWords } from '../words';
import { FieldButton } from './FieldButton';
import { NumberPad } from './NumberPad';

interface PinFormProps {
  label: string;
  submit: string;
  /** Answers undefined when the PIN was taken, else how long to wait before the next try, in ms. */
  check: (pin: string) => Promise<number | undefined>;
}

export const minPinLength = 6;

/** Seconds left of a delay, counting down. */
function useSecondsLeft(): [number, (ms: number) => void] {
  const [left, setLeft] = useState(0);
  useEffect(() => {
    if (left <= 0) return;
    const timer = setTimeout(() => {
      setLeft(left - 1);
    }, 1000);
    return () => {
      clearTimeout(timer);
    };
  }, [left]);
  return [
    left,
    (ms) => {
      setLeft(Math.ceil(ms / 1000));
    },
  ];
}

/** Asks for a PIN on our own pad. A wrong one delays the next try, and says for how long; it never locks a person out. */
export function PinForm({ label, submit, check }: PinFormProps) {
  const { t } = useWords();
  const id = useId();
  const [pin, setPin] = useState('');
  const [wrong, setWrong] = useState(false);
  const [busy, setBusy] = useState(false);
  const [left, setLeft] = useSecondsLeft();
  async function tryPin(event: SubmitEvent) {
    event.preventDefault();
    if (busy || left > 0 || pin.length < minPinLength) return;
    setBusy(true);
    const waitMs = await check(pin);
    setBusy(false);
    setPin('');
    setWrong(waitMs !== undefined);
    if (waitMs !== undefined) setLeft(waitMs);
  }
  const says = left > 0 ? t('field.pin.wait', { seconds: left }) : wrong ? t('field.pin.wrong') : '';
  return (
    <form className="grid gap-2" onSubmit={(event) => void tryPin(event)}>
      <label htmlFor={id}>{label}</label>
      <input
        id={id}
        type="password"
        inputMode="none"
        autoComplete="off"
        value={pin}
        aria-describedby={`${id}-says`}
        aria-invalid={wrong}
        onChange={(event) => {
          setPin(event.target.value.replace(/\D/g, '').slice(0, 12));
        }}
        className="min-h-[3.5rem] w-full border-[3px] border-ink bg-sheet px-3 font-mono text-[1.8rem] tracking-[0.3em] text-ink"
      />
      <p id={`${id}-says`} role="alert" className="m-0 min-h-6 text-[0.95rem]">
        {says}
      </p>
      <NumberPad
        value={pin}
        decimal={false}
        words={t('field.reading.pad')}
        onChange={(value) => {
          setPin(value.replace(/\D/g, ''));
        }}
      />
      <FieldButton type="submit" look="primary" disabled={busy || left > 0 || pin.length < minPinLength}>
        {submit}
      </FieldButton>
    </form>
  );
}
