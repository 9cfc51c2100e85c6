/** A table that goes on over pages, its head on each of them. */
import { leading, muted, usualSize, type Line, type Written } from './pen';
import { margin, type Sheet } from './sheet';

export interface Column {
  head: string;
  /** Part of the width. */
  share: number;
  written?: Written;
}

const gap = 6;
const padding = 2.5;

interface Placed extends Column {
  x: number;
  room: number;
}

function placed(columns: readonly Column[], width: number): Placed[] {
  const whole = columns.reduce((sum, { share }) => sum + share, 0);
  let x = margin;
  return columns.map((column) => {
    const own = (column.share / whole) * width;
    const at = { ...column, x, room: own - gap };
    x += own;
    return at;
  });
}

const heightOf = (cells: readonly Line[][]): number =>
  Math.max(...cells.map((lines) => lines.length)) * usualSize * leading + 2 * padding;

type Element = ReturnType<Sheet['element']>;

function row(
  sheet: Sheet,
  columns: readonly Placed[],
  cells: readonly Line[][],
  more: { type: 'TH' | 'TD'; parent: Element },
): void {
  const top = sheet.y + padding;
  const draw = (index: number) => {
    const column = columns[index];
    const written = more.type === 'TH' ? { colour: muted } : column?.written;
    if (column) sheet.pen.draw(cells[index] ?? [], column.x, top, written);
  };
  if (!sheet.fine) sheet.tagged('P', () => cells.forEach((_, index) => draw(index)), more.parent);
  else {
    const line = sheet.element('TR', more.parent);
    cells.forEach((_, index) => sheet.tagged(more.type, () => draw(index), line));
    line.end();
  }
  sheet.y += heightOf(cells);
  sheet.artifact(() => sheet.rule());
}

/** Writes rows one after the other; headings may stand between them. */
export class Table {
  private readonly columns: Placed[];
  private readonly parent: Element;
  private readonly head: Line[][];

  constructor(
    private readonly sheet: Sheet,
    columns: readonly Column[],
  ) {
    this.columns = placed(columns, sheet.width);
    this.parent = sheet.element(sheet.fine ? 'Table' : 'Sect');
    this.head = this.columns.map(({ head, room }) => sheet.pen.lines(head, room, { colour: muted }));
    sheet.ensure(heightOf(this.head) * 3);
    this.drawHead();
  }

  private drawHead(): void {
    row(this.sheet, this.columns, this.head, { type: 'TH', parent: this.parent });
  }

  row(texts: readonly string[]): void {
    const cells = this.columns.map(({ room, written }, index) =>
      this.sheet.pen.lines(texts[index] ?? '', room, written),
    );
    if (this.sheet.ensure(heightOf(cells))) this.drawHead();
    row(this.sheet, this.columns, cells, { type: 'TD', parent: this.parent });
  }

  end(): void {
    this.parent.end();
    this.sheet.y += 4;
  }
}

/** A whole table. */
export function table(sheet: Sheet, columns: readonly Column[], rows: readonly (readonly string[])[]): void {
  const made = new Table(sheet, columns);
  for (const texts of rows) made.row(texts);
  made.end();
}
