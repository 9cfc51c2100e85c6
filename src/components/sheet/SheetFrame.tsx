import type { ReactNode } from 'react';

/** The border of a drawing sheet around a whole page; on a phone the screen's edge is the border. */
export function SheetFrame({ children }: { children: ReactNode }) {
  return (
    <div className="flex min-h-dvh flex-col md:p-[18px]">
      <div className="flex flex-1 flex-col border-ink bg-sheet md:border-2">{children}</div>
    </div>
  );
}
