import type { ComponentProps } from 'react';
import { buttonClass, type ButtonLook } from './buttonClass';

interface ButtonProps extends ComponentProps<'button'> {
  look?: ButtonLook;
  /** While true the button waits for an answer: it keeps its place and cannot be pressed twice. */
  busy?: boolean;
}

/** A button of the office: 44 px high, square edges, ink on paper. */
export function Button({ look = 'outlined', busy = false, className, disabled, ...rest }: ButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      disabled={disabled || busy}
      aria-busy={busy || undefined}
      className={buttonClass(look, className)}
    />
  );
}
