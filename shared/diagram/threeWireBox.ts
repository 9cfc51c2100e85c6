/** A sensor with its own supply: both poles go in, the signal comes out, and what switches it is drawn inside. */
import { railAt, x, type Frame } from './frame';
import type { LoopFacts } from './loopFacts';
import { box, line, tagLabel, wordLabel, type Primitive } from './primitives';
import { lettered } from './symbols/diodes';
import { npn, pnp } from './symbols/switches';
import { chain } from './symbols/symbol';
import { say } from '../panel/says';

const half = 42;
const inner = x.field + 12;

function inside({ point }: LoopFacts, signal: number): Primitive[] {
  const upper = () => chain(inner, signal - half, signal, [pnp], true);
  const lower = () => chain(inner, signal, signal + half, [npn], true);
  const out = line('wire', [inner, signal], [x.field + 36, signal]);
  switch (point.device.kind) {
    case 'pnp':
      return [...upper(), out];
    case 'npn':
      return [...lower(), out];
    case 'push-pull':
      return [...upper(), ...lower(), out];
    default:
      return [
        ...lettered('mA').draw([x.field + 8, signal], true),
        line('wire', [x.field + 22, signal], [x.field + 36, signal]),
      ];
  }
}

const letters: Partial<Record<string, string>> = { pnp: 'PNP', npn: 'NPN', 'push-pull': 'P/N' };

export function threeWireBox(facts: LoopFacts, frame: Frame): Primitive[] {
  const { signal } = frame;
  const { device } = facts.point;
  const lettersY = device.kind === 'npn' ? signal - 24 : device.kind === 'pnp' ? signal + 34 : signal + 5;
  return [
    ...frame.fieldSides.map((side) =>
      line('wire', [x.field, railAt(frame, side)], [x.field, signal + side * half]),
    ),
    box([x.field, signal], 72, half * 2),
    ...inside(facts, signal),
    tagLabel([x.field - 31, lettersY], letters[device.kind] ?? '', { bold: true }),
    tagLabel([x.field - 44, signal - 3], device.tag ?? '', { anchor: 'end', bold: true, room: 74 }),
    wordLabel(
      [x.field - 44, signal + 13],
      say(device.kind === 'transmitter' ? 'diagram.kind.transmitter' : 'diagram.kind.sensor'),
      {
        anchor: 'end',
        tone: 'muted',
      },
    ),
  ];
}
