import type { ReactNode } from 'react';

export interface TitleCell {
  label: string;
  /** In the monospaced face. */
  value: string;
  /** Plain words after the value. */
  note?: string;
}

/** The drawing's title block as a header strip: the first cell takes the room, the others their own width. */
export function TitleStrip({ cells, end }: { cells: TitleCell[]; end?: ReactNode }) {
  return (
    <div className="flex items-stretch border-b-2 border-ink bg-paper">
      <dl className="title-cells m-0 flex min-w-0 flex-1 items-stretch">
        {cells.map((cell, index) => (
          <div
            key={cell.label}
            className={`min-w-0 px-2.5 py-0.5 ${index === 0 ? 'flex-1' : 'shrink-0 border-l-2 border-ink'}`}
          >
            <dt className="text-[0.65rem] leading-tight text-muted">{cell.label}</dt>
            <dd className="m-0 truncate text-[0.82rem] leading-snug">
              <b className="font-mono">{cell.value}</b>
              {cell.note && <span> {cell.note}</span>}
            </dd>
          </div>
        ))}
      </dl>
      {end}
    </div>
  );
}
