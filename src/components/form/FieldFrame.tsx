import type { ReactNode } from 'react';

interface FieldFrameProps {
  id: string;
  label: string;
  hint?: string;
  error?: string;
  children: ReactNode;
}

export const hintId = (id: string) => `${id}-hint`;
export const errorId = (id: string) => `${id}-error`;

/** The ids of hint and error, so that a screen reader hears them with the field. */
export const describedBy = (id: string, hint?: string, error?: string): string | undefined =>
  [hint && hintId(id), error && errorId(id)].filter(Boolean).join(' ') || undefined;

export const controlClass =
  'block min-h-11 w-full rounded-none border-2 border-edge bg-sheet px-3 py-1.5 text-ink focus:border-ink aria-invalid:border-ink aria-invalid:border-l-8';

/** Label above, hint under it, then the control, then what is wrong with it. */
export function FieldFrame({ id, label, hint, error, children }: FieldFrameProps) {
  return (
    <div className="my-4 max-w-[34rem]">
      <label htmlFor={id} className="block font-bold">
        {label}
      </label>
      {hint && (
        <p id={hintId(id)} className="m-0 text-sm text-muted">
          {hint}
        </p>
      )}
      <div className="mt-1">{children}</div>
      {error && (
        <p id={errorId(id)} className="m-0 mt-1 font-bold">
          <span aria-hidden="true">▲ </span>
          {error}
        </p>
      )}
    </div>
  );
}
