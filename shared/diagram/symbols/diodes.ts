/** Diodes, the LED of an input, suppressors and resistors. */
import { box, line, polygon, tagLabel, type Place, type Primitive } from '../primitives';
import { arrowHead } from './switches';
import type { Symbol } from './symbol';

function triangle([x, y]: Place, down: boolean, wide: number): Primitive[] {
  const sign = down ? 1 : -1;
  return [
    polygon('none', [x - wide, y - 8 * sign], [x + wide, y - 8 * sign], [x, y + 8 * sign]),
    line('wire', [x - wide, y + 8 * sign], [x + wide, y + 8 * sign]),
  ];
}
const light = ([x, y]: Place): Primitive[] =>
  [0, 7].flatMap((shift) => [
    line('thin', [x, y - 2 + shift], [x + 8, y - 7 + shift]),
    arrowHead([x + 9, y - 8 + shift], [0.85, -0.53], 4),
  ]);

export const diode: Symbol = { half: 8, draw: (at, down) => triangle(at, down, 9) };
export const led: Symbol = {
  half: 8,
  draw: ([x, y], down) => [...triangle([x, y], down, 9), ...light([x + 11, y])],
};
/** Back to back: either direction lights one. */
export const ledPair: Symbol = {
  half: 14,
  draw: ([x, y]) => [
    line('wire', [x - 9, y], [x - 9, y - 14], [x + 9, y - 14], [x + 9, y]),
    line('wire', [x - 9, y], [x - 9, y + 14], [x + 9, y + 14], [x + 9, y]),
    ...triangle([x - 9, y], true, 6),
    ...triangle([x + 9, y], false, 6),
    ...light([x + 16, y + 2]),
  ],
};
export const resistor: Symbol = { half: 15, draw: (at) => [box(at, 11, 30)] };
export const fuseSymbol: Symbol = {
  half: 12,
  draw: ([x, y]) => [box([x, y], 11, 24), line('thin', [x, y - 12], [x, y + 12])],
};
/** A suppressor that is no diode, named by its usual letters. */
export const lettered = (letters: string): Symbol => ({
  half: 11,
  draw: ([x, y]) => [
    box([x, y], 28, 22),
    tagLabel([x, y + 4], letters, { anchor: 'middle', size: 11, room: 26 }),
  ],
});
