import type { ComponentProps, ReactNode } from 'react';

interface CheckFieldProps extends Omit<ComponentProps<'input'>, 'children'> {
  label: ReactNode;
}

/** A box to tick; the whole line is the target. */
export function CheckField({ label, className, ...rest }: CheckFieldProps) {
  return (
    <label className={`flex min-h-11 cursor-pointer items-center gap-3 ${className ?? ''}`}>
      <input type="checkbox" {...rest} className="h-5 w-5 shrink-0 accent-ink" />
      <span className="min-w-0">{label}</span>
    </label>
  );
}
