import type { ReactNode } from 'react';

/** A headed part of a sheet. */
export function SheetSection({
  title,
  note,
  children,
}: {
  title: string;
  note?: ReactNode;
  children: ReactNode;
}) {
  return (
    <section className="mb-8">
      <h2 className="m-0 mb-2 text-lg font-bold">{title}</h2>
      {note && <p className="m-0 mb-2 max-w-[66ch] text-muted">{note}</p>}
      {children}
    </section>
  );
}
