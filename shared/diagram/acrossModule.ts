/** What stands between the point's terminal and the common: a resistor across an input, a suppressor across a contact, foreign voltage. */
import { x, type Frame } from './frame';
import type { LoopFacts } from './loopFacts';
import { nodeReach } from './moduleColumn';
import { box, circle, dashed, line, tagLabel, type Primitive } from './primitives';
import { ohms, suppressorSymbol } from './sideBranches';
import { resistor } from './symbols/diodes';
import { arrowHead } from './symbols/switches';
import { chain, type Symbol } from './symbols/symbol';

function across({ signal, columnSide: side }: Frame, symbol: Symbol, label: string): Primitive[] {
  const node = signal + side * nodeReach;
  const [from, to] = side === 1 ? [signal, node] : [node, signal];
  return [
    ...chain(x.side, from, to, [symbol], true),
    line('wire', [x.side, node], [x.column, node]),
    tagLabel([x.side - 12, node + (side === 1 ? 2 : 8)], label, { anchor: 'end', size: 12 }),
  ];
}

export function acrossModule({ point, output }: LoopFacts, frame: Frame): Primitive[] {
  const { bleeder, suppressor } = point;
  return [
    ...(bleeder && !output
      ? across(frame, resistor, point.otherSupply === 'none' ? ohms(bleeder.ohm) : '')
      : []),
    ...(suppressor?.at === 'contact' && suppressor.kind !== 'none'
      ? across(frame, suppressorSymbol(suppressor), '')
      : []),
  ];
}

/** Voltage that reaches this terminal besides its own loop: an arrow onto the terminal from the supply's tag. */
export function foreignFeed({ point }: LoopFacts, { signal, columnSide: side }: Frame): Primitive[] {
  if (point.otherSupply === 'none') return [];
  const at = x.terminal - 18;
  const y = signal + side * 54;
  return [
    line('wire', [at + 6, y - side * 11], [at + 6, signal + side * 17]),
    arrowHead([at + 6, signal + side * 17], [0, -side], 10),
    box([at - 2, y], 56, 22),
    box([at - 2, y], 50, 16, 'none', 'thin'),
    tagLabel([at - 2, y + 4], point.otherSupply ?? '?', { anchor: 'middle', bold: true, size: 12, room: 46 }),
  ];
}

/** The screen round the signal conductor, and where it is earthed. */
export function screenMark({ point }: LoopFacts, frame: Frame, from: number, marked: boolean): Primitive[] {
  if (point.cable?.screened !== true) return [];
  const at = from + 10;
  const { signal, columnSide: side } = frame;
  const ring = circle([at, signal], 10, 'none', marked ? 'wire' : 'thin');
  if (point.cable.screenEarthed !== 'panel' && point.cable.screenEarthed !== 'both') return [ring];
  const y = signal + side * 34;
  const weight = marked ? 'thick' : 'thin';
  return [
    ring,
    line(weight, [at, signal + side * 10], [at, y]),
    ...[9, 6, 3].map((half, index) =>
      line('wire', [at - half, y + side * index * 4], [at + half, y + side * index * 4]),
    ),
    ...(point.cable.screenEarthed === 'both'
      ? [dashed([at - 20, signal + side * 12], [at - 10, signal])]
      : []),
  ];
}
