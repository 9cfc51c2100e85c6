/** What an output drives. */
import type { LoadKind } from '../../panel/device';
import { box, circle, line, polygon, tagLabel } from '../primitives';
import { diode, led } from './diodes';
import type { Symbol } from './symbol';

const coil: Symbol = { half: 11, draw: (at) => [box(at, 38, 22)] };
/** The coil of a valve, with the valve's body beside it. */
const solenoid: Symbol = {
  half: 11,
  draw: ([x, y]) => [
    box([x, y], 38, 22),
    line('thin', [x - 19, y + 11], [x + 19, y - 11]),
    line('thin', [x + 19, y], [x + 26, y]),
    polygon('none', [x + 26, y - 8], [x + 26, y + 8], [x + 35, y]),
    polygon('none', [x + 44, y - 8], [x + 44, y + 8], [x + 35, y]),
  ],
};
const lamp: Symbol = {
  half: 14,
  draw: ([x, y]) => [
    circle([x, y], 14),
    line('wire', [x - 10, y - 10], [x + 10, y + 10]),
    line('wire', [x - 10, y + 10], [x + 10, y - 10]),
  ],
};
const motor: Symbol = {
  half: 16,
  draw: ([x, y]) => [
    circle([x, y], 16),
    tagLabel([x, y + 5], 'M', { anchor: 'middle', size: 15, bold: true }),
  ],
};
const heater: Symbol = { half: 16, draw: (at) => [box(at, 13, 32)] };
const electronic: Symbol = {
  half: 13,
  draw: ([x, y], down) => [box([x, y], 38, 26), ...diode.draw([x, y], down)],
};

const byKind: Record<LoadKind, Symbol> = { coil, solenoid, lamp, motor, led, electronic, resistive: heater };
export const loadSymbol = (kind: LoadKind): Symbol => byKind[kind];
