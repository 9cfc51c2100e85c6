import type { ReactNode } from 'react';

export interface TitleCell {
  label: string;
  value: ReactNode;
}

/** The cells at the lower right of a drawing sheet. */
export function TitleBlock({ cells }: { cells: readonly TitleCell[] }) {
  return (
    <dl className="m-0 flex flex-wrap max-md:border-t max-md:border-ink">
      {cells.map((cell) => (
        <div
          key={cell.label}
          className="min-w-20 grow md:min-w-28 border-ink px-3 py-1.5 md:border-l max-md:not-first:border-l"
        >
          <dt className="text-xs text-muted">{cell.label}</dt>
          <dd className="m-0 font-mono font-semibold wrap-anywhere">{cell.value}</dd>
        </div>
      ))}
    </dl>
  );
}
