/** The symbol of a field device that hangs on one conductor, and the short text beside it. */
import type { Device } from '../panel/device';
import { box, line, polygon } from './primitives';
import { contactFrame } from './symbols/contactFrame';
import { diode, led, lettered } from './symbols/diodes';
import { loadSymbol } from './symbols/loads';
import { contact } from './symbols/switches';
import type { Symbol } from './symbols/symbol';

/** A resistor whose value follows the temperature. */
const rtd: Symbol = {
  half: 16,
  draw: ([x, y]) => [box([x, y], 13, 32), line('thin', [x - 14, y + 12], [x - 9, y + 12], [x + 11, y - 13])],
};
const thermocouple: Symbol = {
  half: 12,
  draw: ([x, y]) => [
    line('wire', [x, y - 12], [x + 14, y], [x, y + 12]),
    polygon('ink', [x + 10, y - 4], [x + 18, y], [x + 10, y + 4]),
  ],
};
/** Control side: an LED; load side: a contact, drawn where its own supply is named. */
const ssr: Symbol = {
  half: 17,
  draw: ([x, y], down) => [
    box([x, y], 44, 34),
    ...led.draw([x, y], down),
    line('thin', [x, y - 17], [x, y + 17]),
  ],
};

export function fieldSymbol(device: Device): Symbol {
  switch (device.kind) {
    case 'contact':
      return contact;
    case 'two-wire':
      return contactFrame;
    case 'ssr-output':
      return lettered('SSR');
    case 'namur':
      return lettered('mA');
    case 'transmitter':
      return lettered('mA');
    case 'rtd':
      return rtd;
    case 'thermocouple':
      return thermocouple;
    case 'load':
      return device.load === 'led' && device.reversed === true
        ? { half: diode.half, draw: (at, down) => led.draw(at, !down) }
        : loadSymbol(device.load);
    case 'ssr-control':
      return ssr;
    default:
      return lettered(device.kind.toUpperCase());
  }
}

const amperes = (A: number): string =>
  A < 1 ? `${Number((A * 1000).toPrecision(3))} mA` : `${Number(A.toPrecision(3))} A`;

/** Volts and current of what an output drives; nothing for what an input reads. */
export function ratingOf(device: Device): string | undefined {
  if (device.kind === 'load') return `${device.V} V ${amperes(device.A)}`;
  if (device.kind === 'ssr-control') return `${device.Vmin}–${device.Vmax} V ${device.mA} mA`;
  return undefined;
}
