import type { ReactNode } from 'react';

/** A terminal or device tag, boxed in the monospaced face so that 0 and O, 1 and l stay apart. */
export function TagBox({ children }: { children: ReactNode }) {
  return (
    <span className="mx-[0.06em] inline-block border-2 border-current bg-sheet px-[0.22em] font-mono leading-[1.2] font-semibold whitespace-nowrap">
      {children}
    </span>
  );
}
