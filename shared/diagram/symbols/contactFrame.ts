/** A two-wire sensor: an electronic switch in a box, with the mark of a proximity switch. */
import { box, line, polygon } from '../primitives';
import type { Symbol } from './symbol';

export const contactFrame: Symbol = {
  half: 22,
  draw: ([x, y]) => [
    box([x, y], 52, 44),
    polygon('none', [x - 20, y], [x - 13, y - 7], [x - 6, y], [x - 13, y + 7]),
    line('wire', [x + 8, y - 22], [x + 8, y - 10]),
    line('wire', [x + 8, y + 22], [x + 8, y + 10], [x - 2, y - 8]),
    line('wire', [x, y - 22], [x + 8, y - 22]),
    line('wire', [x, y + 22], [x + 8, y + 22]),
  ],
};
