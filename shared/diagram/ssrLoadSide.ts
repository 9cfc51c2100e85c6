/** The load side of a solid-state relay: a circuit of its own, on another supply, beside the relay's control side. */
import type { DeviceOf } from '../panel/device';
import { x } from './frame';
import { box, dashed, line, tagLabel, type Primitive } from './primitives';
import { loadSymbol } from './symbols/loads';
import { contact } from './symbols/switches';
import { chain } from './symbols/symbol';

const contactX = x.field - 46;
const loadX = 38;
const reach = 34;

export const ssrLoadSide = ({ load }: DeviceOf<'ssr-control'>, middle: number): Primitive[] => [
  dashed([x.field - 22, middle], [contactX - 6, middle]),
  ...chain(contactX, middle - reach, middle + reach, [contact], true),
  ...chain(loadX, middle - reach, middle + reach, [loadSymbol(load.load)], true),
  line('wire', [contactX, middle - reach], [loadX, middle - reach]),
  line('wire', [contactX, middle + reach], [loadX, middle + reach]),
  box([(contactX + loadX) / 2, middle + reach], 42, 18),
  tagLabel([(contactX + loadX) / 2, middle + reach + 4], load.supply, {
    anchor: 'middle',
    size: 12,
    bold: true,
    room: 38,
  }),
];
