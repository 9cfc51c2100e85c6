/** Writes text on a page: measures, wraps and draws words, each in a face that has its signs. */
import type PDFDocument from 'pdfkit';
import { faceFiles, faceFor, type Face } from './faces';

export type Pdf = InstanceType<typeof PDFDocument>;

export const ink = '#14202b';
export const muted = '#5a6570';
export const rule = '#c9c4b8';

interface Run {
  text: string;
  face: Face;
  width: number;
}
export type Line = Run[];

export interface Written {
  face?: Face;
  size?: number;
  colour?: string;
}

/** Line height in parts of the letters' size. */
export const leading = 1.3;
export const usualSize = 8.5;

export class Pen {
  /** Width of a word at size 1, by face: the same words come back thousands of times in one record. */
  private readonly widths = new Map<string, number>();

  constructor(readonly pdf: Pdf) {
    for (const [face, file] of Object.entries(faceFiles)) pdf.registerFont(face, file);
  }

  private widthOf(text: string, face: Face): number {
    const key = `${face} ${text}`;
    const known = this.widths.get(key);
    if (known !== undefined) return known;
    const width = this.pdf.font(face).fontSize(100).widthOfString(text) / 100;
    this.widths.set(key, width);
    return width;
  }

  private run(text: string, wished: Face, size: number): Run {
    const face = faceFor(text, wished);
    return { text, face, width: this.widthOf(text, face) * size };
  }

  width(text: string, { face = 'words', size = usualSize }: Written = {}): number {
    const words = text.split(' ');
    const spaces = (words.length - 1) * this.widthOf(' ', face) * size;
    return words.reduce((sum, word) => sum + this.run(word, face, size).width, spaces);
  }

  /** A word longer than the line (a digest, say) is broken where the line ends. */
  private pieces(word: string, face: Face, size: number, room: number): Run[] {
    const whole = this.run(word, face, size);
    if (whole.width <= room || word.length < 2) return [whole];
    const letters = Math.max(1, Math.floor((room / whole.width) * word.length) - 1);
    return [
      this.run(word.slice(0, letters), face, size),
      ...this.pieces(word.slice(letters), face, size, room),
    ];
  }

  lines(text: string, room: number, { face = 'words', size = usualSize }: Written = {}): Line[] {
    const made: Line[] = [[]];
    let used = 0;
    for (const word of text.split(/\s+/).filter(Boolean))
      for (const piece of this.pieces(word, face, size, room)) {
        const space = used > 0 ? this.widthOf(' ', face) * size : 0;
        if (used > 0 && used + space + piece.width > room) {
          made.push([]);
          used = 0;
        }
        used += (used > 0 ? space : 0) + piece.width;
        made.at(-1)?.push(piece);
      }
    return made;
  }

  /** @param top of the first line. */
  draw(lines: readonly Line[], x: number, top: number, written: Written = {}): void {
    const { face = 'words', size = usualSize, colour = ink } = written;
    const space = this.widthOf(' ', face) * size;
    this.pdf.fillColor(colour);
    lines.forEach((line, index) => {
      let at = x;
      for (const part of joined(line)) {
        this.place(part, size, at, top + index * size * leading + size);
        at += part.width + space * part.words;
      }
    });
  }

  private place({ face, text }: Run, size: number, x: number, baseline: number): void {
    this.pdf.font(face).fontSize(size).text(text, x, baseline, { lineBreak: false, baseline: 'alphabetic' });
  }
}

/** Neighbours in one face are drawn as one: `words` counts the spaces that follow. */
function joined(line: Line): (Run & { words: number })[] {
  const made: (Run & { words: number })[] = [];
  for (const run of line) {
    const last = made.at(-1);
    if (last?.face === run.face) {
      last.text += ` ${run.text}`;
      last.width += run.width;
      last.words += 1;
    } else made.push({ ...run, words: 1 });
  }
  return made;
}
