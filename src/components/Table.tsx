import type { ReactNode } from 'react';

export interface Column<Row> {
  head: string;
  /** A head nobody needs to see (a column of buttons) is still read aloud. */
  headHidden?: boolean;
  cell: (row: Row) => ReactNode;
  className?: string;
  /** On a phone the cell stands alone, without its head before it. */
  bare?: boolean;
}

interface TableProps<Row> {
  caption: string;
  columns: Column<Row>[];
  rows: readonly Row[];
  keyOf: (row: Row) => string;
}

// Below 768 px each row becomes a block of "head: cell" lines; the roles keep it a table for screen readers.
export function Table<Row>({ caption, columns, rows, keyOf }: TableProps<Row>) {
  return (
    <table role="table" className="w-full table-fixed border-collapse text-left max-md:block">
      <caption className="sr-only">{caption}</caption>
      <thead role="rowgroup" className="max-md:sr-only">
        <tr role="row" className="border-b border-ink">
          {columns.map((column) => (
            <th
              key={column.head}
              role="columnheader"
              scope="col"
              className={`pr-3 pb-1.5 text-sm font-semibold text-muted ${column.className ?? ''}`}
            >
              <span className={column.headHidden ? 'sr-only' : ''}>{column.head}</span>
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup" className="max-md:block max-md:border-t max-md:border-ink">
        {rows.map((row) => (
          <tr key={keyOf(row)} role="row" className="border-b border-rule max-md:block max-md:py-3">
            {columns.map((column) => (
              <td
                key={column.head}
                role="cell"
                className="py-2 pr-3 align-middle wrap-anywhere max-md:flex max-md:flex-wrap max-md:gap-x-3 max-md:py-1"
              >
                {!column.bare && !column.headHidden && (
                  <span aria-hidden="true" className="w-24 shrink-0 text-sm text-muted md:hidden">
                    {column.head}
                  </span>
                )}
                <div className="min-w-0 max-md:flex-1">{column.cell(row)}</div>
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
