/** The pages of a record: where the next line goes, when a new page begins, and what each piece is for a screen reader. */
import { leading, muted, rule, ink, type Pen, type Pdf, type Written } from './pen';

export const margin = 36;
/** Room for the title block at the foot of every page. */
export const footRoom = 58;

type Element = ReturnType<Pdf['struct']>;
/** Beyond this many table rows each row is one paragraph for a screen reader: a tag a cell would double the file. */
const mostFineRows = 1500;

export class Sheet {
  y = margin;
  private readonly root: Element;
  readonly fine: boolean;

  constructor(
    readonly pen: Pen,
    rows: number,
  ) {
    this.fine = rows <= mostFineRows;
    this.root = pen.pdf.struct('Document');
    pen.pdf.addStructure(this.root);
  }

  get pdf(): Pdf {
    return this.pen.pdf;
  }
  get width(): number {
    return this.pdf.page.width - 2 * margin;
  }
  get bottom(): number {
    return this.pdf.page.height - margin - footRoom;
  }

  /** Begins a new page unless `height` fits on this one. */
  ensure(height: number): boolean {
    if (this.y + height <= this.bottom) return false;
    this.pdf.addPage();
    this.y = margin;
    return true;
  }

  /** An element of the document's structure, under the root or another element. */
  element(type: string, parent: Element = this.root): Element {
    const made = this.pdf.struct(type);
    parent.add(made);
    return made;
  }

  /** Draws content that is one element for a screen reader; `alt` says a picture in words. */
  tagged(type: string, draw: () => void, parent: Element = this.root, alt?: string): void {
    const made = alt === undefined ? this.pdf.struct(type, {}, draw) : this.pdf.struct(type, { alt }, draw);
    parent.add(made);
    made.end();
  }

  /** Drawn for the eye only: rules, frames. */
  artifact(draw: () => void): void {
    this.pdf.markContent('Artifact', { type: 'Layout' });
    draw();
    this.pdf.endMarkedContent();
  }

  heading(text: string, level: 1 | 2 | 3): void {
    const size = { 1: 17, 2: 12, 3: 10 }[level];
    const lines = this.pen.lines(text, this.width, { face: 'bold', size });
    const height = lines.length * size * leading;
    this.ensure(height + 60);
    if (level === 2) {
      this.y += 10;
      this.artifact(() => this.rule(ink, 1.2));
      this.y += 4;
    }
    this.tagged(`H${level}`, () => this.pen.draw(lines, margin, this.y, { face: 'bold', size }));
    this.y += height + 3;
  }

  paragraph(text: string, written: Written = {}): void {
    const size = written.size ?? 9;
    const lines = this.pen.lines(text, this.width, { ...written, size });
    this.ensure(lines.length * size * leading);
    this.tagged('P', () => this.pen.draw(lines, margin, this.y, { ...written, size }));
    this.y += lines.length * size * leading + 2;
  }

  /** Names with their values, two side by side. */
  facts(facts: readonly (readonly [name: string, value: string])[]): void {
    for (let index = 0; index < facts.length; index += 2) this.factRow(facts.slice(index, index + 2));
  }

  private factRow(pair: readonly (readonly [string, string])[]): void {
    const room = this.width / 2 - 8;
    const nameRoom = 84;
    const cells = pair.map(([name, value]) => ({
      name: this.pen.lines(name, nameRoom, { size: 8 }),
      value: this.pen.lines(value, room - nameRoom, { size: 9, face: 'bold' }),
    }));
    const height =
      Math.max(...cells.map(({ name, value }) => Math.max(name.length, value.length))) * 9 * leading;
    this.ensure(height);
    cells.forEach(({ name, value }, index) => {
      const x = margin + index * (this.width / 2);
      this.tagged('P', () => {
        this.pen.draw(name, x, this.y + 1, { size: 8, colour: muted });
        this.pen.draw(value, x + nameRoom, this.y, { size: 9, face: 'bold' });
      });
    });
    this.y += height + 2;
  }

  rule(colour = rule, weight = 0.5): void {
    this.pdf
      .moveTo(margin, this.y)
      .lineTo(margin + this.width, this.y)
      .lineWidth(weight)
      .strokeColor(colour)
      .stroke();
  }
}
