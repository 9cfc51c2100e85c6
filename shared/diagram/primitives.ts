/** What a picture is made of: lines, shapes and texts on a plane, in units that are about one CSS pixel on a phone. */
import type { Text } from '../panel/says';

export type Place = readonly [x: number, y: number];
/** `thick` is the conductor in question. */
export type Weight = 'thin' | 'wire' | 'thick';
export type Fill = 'none' | 'sheet' | 'ink';

export type Primitive =
  | { kind: 'line'; through: Place[]; weight: Weight; dashed?: true }
  | {
      kind: 'rect';
      x: number;
      y: number;
      width: number;
      height: number;
      weight: Weight;
      fill: Fill;
      dashed?: true;
    }
  | { kind: 'circle'; x: number; y: number; r: number; weight: Weight; fill: Fill }
  | { kind: 'polygon'; corners: Place[]; weight: Weight; fill: Fill }
  | Label;

export interface Label {
  kind: 'label';
  x: number;
  /** Base line of the letters. */
  y: number;
  anchor: 'start' | 'middle' | 'end';
  size: number;
  /** Tags, terminals and readings stand in the monospaced face, words in the other. */
  says: { tag: string } | { words: Text };
  bold?: true;
  tone: 'ink' | 'muted' | 'onInk';
  /** Letters are made smaller, then cut, to stay within this width. */
  room?: number;
}

export const line = (weight: Weight, ...through: Place[]): Primitive => ({ kind: 'line', through, weight });
export const dashed = (...through: Place[]): Primitive => ({
  kind: 'line',
  through,
  weight: 'thin',
  dashed: true,
});
/** A rectangle by its middle. */
export const box = (
  [x, y]: Place,
  width: number,
  height: number,
  fill: Fill = 'sheet',
  weight: Weight = 'wire',
): Primitive => ({ kind: 'rect', x: x - width / 2, y: y - height / 2, width, height, fill, weight });
export const circle = (
  [x, y]: Place,
  r: number,
  fill: Fill = 'sheet',
  weight: Weight = 'wire',
): Primitive => ({
  kind: 'circle',
  x,
  y,
  r,
  fill,
  weight,
});
export const polygon = (fill: Fill, ...corners: Place[]): Primitive => ({
  kind: 'polygon',
  corners,
  fill,
  weight: 'thin',
});

type LabelMore = Partial<Pick<Label, 'anchor' | 'size' | 'bold' | 'tone' | 'room'>>;
/** A tag, terminal or reading. */
export const tagLabel = ([x, y]: Place, tag: string, more: LabelMore = {}): Label => ({
  kind: 'label',
  x,
  y,
  anchor: 'start',
  size: 13,
  tone: 'ink',
  says: { tag },
  ...more,
});
/** Words, in the reader's language. */
export const wordLabel = ([x, y]: Place, words: Text, more: LabelMore = {}): Label => ({
  ...tagLabel([x, y], '', more),
  says: { words },
});
