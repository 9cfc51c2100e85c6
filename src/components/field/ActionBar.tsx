import type { ReactNode } from 'react';

/** The answers, fixed under the thumb: one primary, the others in a row below it. On a short screen they scroll instead. */
export function ActionBar({ primary, children }: { primary?: ReactNode; children?: ReactNode }) {
  return (
    <div className="grid gap-2 border-t-2 border-ink bg-sheet px-3 py-2.5">
      {primary}
      {children && (
        <div className="flex flex-wrap gap-2 text-[1rem] [&>:is(a,button)]:flex-auto [&>:is(a,button)]:px-1.5">
          {children}
        </div>
      )}
    </div>
  );
}
