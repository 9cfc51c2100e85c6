import type { ReactNode } from 'react';

/** The name of a thing on the drawing, in the monospaced face inside a box. */
export function Tag({ children }: { children: ReactNode }) {
  return (
    <span className="inline-block border border-ink bg-sheet px-1.5 font-mono text-[0.9em] font-semibold wrap-anywhere">
      {children}
    </span>
  );
}
