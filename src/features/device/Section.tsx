import type { ReactNode } from 'react';

/** One matter of this device, under its heading. */
export function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="grid gap-2 border-2 border-ink bg-sheet p-3">
      <h2 className="m-0 font-bold text-[1.15rem] leading-tight">{title}</h2>
      {children}
    </section>
  );
}
