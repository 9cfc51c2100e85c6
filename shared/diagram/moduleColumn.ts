/** The module's side of the loop: its input or output inside a dashed frame, its common terminal, the rail. */
import type { ModuleIo } from '../panel/moduleIo';
import { railAt, x, type Frame } from './frame';
import type { LoopFacts } from './loopFacts';
import { box, line, tagLabel, type Primitive } from './primitives';
import { led, ledPair, lettered, resistor } from './symbols/diodes';
import { anySwitch, contact, npn, pnp, triac } from './symbols/switches';
import { chain, type Symbol } from './symbols/symbol';

/** `away`: the current the part is made for runs from the point's terminal to the common. */
interface Part {
  symbols: Symbol[];
  away: boolean;
}

const ledOf = (polarity: string, bridge?: boolean): Part =>
  polarity === 'either' || bridge === true
    ? { symbols: [ledPair], away: true }
    : { symbols: [led], away: polarity === 'positive-only' };

const switches = {
  relay: { symbols: [contact], away: true },
  sinking: { symbols: [npn], away: true },
  sourcing: { symbols: [pnp], away: false },
  triac: { symbols: [triac], away: true },
  'mosfet-ac-dc': { symbols: [anySwitch], away: true },
} satisfies Record<string, Part>;

function partOf(io: ModuleIo | undefined): Part {
  switch (io?.kind) {
    case undefined:
      return { symbols: [lettered('?')], away: true };
    case 'digital-input':
      return ledOf(io.polarity, io.bridge);
    case 'opto-input': {
      const { symbols, away } = ledOf(io.polarity);
      return { symbols: [resistor, ...symbols], away };
    }
    case 'digital-output':
      return switches[io.technology];
    case 'analogue-input':
      return {
        symbols: [lettered(io.signal.endsWith('mA') ? 'mA' : io.signal.endsWith('V') ? 'V' : '°C')],
        away: true,
      };
    case 'analogue-output':
      return { symbols: [lettered(io.signal.endsWith('mA') ? 'mA' : 'V')], away: false };
  }
}

const frameReach = 64;
/** From the signal to the node below the module where a part across it hangs. */
export const nodeReach = 72;

export function moduleColumn(facts: LoopFacts, frame: Frame): Primitive[] {
  const { signal, columnSide: side, columnDown } = frame;
  const { symbols, away } = partOf(facts.module?.io);
  const rail = railAt(frame, side);
  const inner = signal + side * frameReach;
  const [from, to] = columnDown ? [signal, inner] : [inner, signal];
  const common = rail - side * 24;
  return [
    line('wire', [x.terminal, signal], [x.column, signal]),
    ...chain(x.column, from, to, columnDown ? symbols : [...symbols].reverse(), away === columnDown),
    line('wire', [x.column, inner], [x.column, rail]),
    {
      kind: 'rect',
      x: x.column - 28,
      y: columnDown ? signal - 12 : inner,
      width: 66,
      height: frameReach + 12,
      weight: 'thin',
      fill: 'none',
      dashed: true,
    },
    tagLabel([x.column + 5, signal - side * 19 + (columnDown ? 0 : 10)], facts.module?.tag ?? '?', {
      anchor: 'middle',
      bold: true,
      room: 70,
    }),
    box([x.column, common], 62, 20),
    tagLabel([x.column, common + 4], facts.group?.terminal ?? '?', { anchor: 'middle', size: 12, room: 58 }),
  ];
}
