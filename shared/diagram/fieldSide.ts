/** The field side of a loop: what hangs between a pole and the signal, with what stands across it. */
import type { Device } from '../panel/device';
import type { ConductorRole } from '../panel/panelSchema';
import { fieldSymbol, ratingOf } from './fieldSymbol';
import { railAt, threeWireLength, x, type Frame } from './frame';
import { wiresOf, type LoopFacts } from './loopFacts';
import { line, tagLabel, wordLabel, type Primitive } from './primitives';
import { fuseWords } from './rails';
import { sideBranches, sidesOf } from './sideBranches';
import { ssrLoadSide } from './ssrLoadSide';
import { fuseSymbol } from './symbols/diodes';
import { chain, type Symbol } from './symbols/symbol';
import { threeWireBox } from './threeWireBox';
import { say } from '../panel/says';

const eachLength = 52;
const mainLength = 64;
/** Wire letters and terminal stand along this stretch, next to the rail. */
const wireLength = 44;

/** Devices in the order they are met from the rail; the point's own device is last, next to its terminal. */
const inSeries = ({ point }: LoopFacts): Device[] => [...(point.series ?? [])].reverse();

/** The fuse of a point: in the positive or line side of its branch (common practice; the file does not say). */
const fuseInBranch = ({ point, poles }: LoopFacts): Symbol[] =>
  point.fuse && poles.common === 'bottom' ? [fuseSymbol] : [];

export function fieldLength(facts: LoopFacts): number {
  if (facts.field === 'both-poles') return threeWireLength;
  const before = inSeries(facts).length + fuseInBranch(facts).length;
  return wireLength + before * eachLength + mainLength + (sidesOf(facts).length > 0 ? 14 : 0);
}

const rolesAt = (side: 1 | -1, both: boolean): ConductorRole[] => [
  ...(side === 1 ? (['minus', 'neutral'] as const) : (['plus', 'line'] as const)),
  ...(both && side === -1 ? [] : (['return'] as const)),
];

/** The conductor from a rail to the field side: its letters, its number, its terminal; thick when in question. */
export function poleConductor(
  facts: LoopFacts,
  frame: Frame,
  side: 1 | -1,
  mark: string | undefined,
): Primitive[] {
  const roles = rolesAt(side, facts.field === 'both-poles');
  const wires = wiresOf(facts.point, roles);
  const rail = railAt(frame, side);
  const [first] = wires;
  if (!first) return [];
  const near = side === -1 ? rail + 18 : rail - 24;
  const marked = wires.some(({ role }) => role === mark);
  return [
    ...(marked ? [line('thick', [x.field, rail], [x.field, rail - side * wireLength])] : []),
    tagLabel([x.field + 9, near], [first.colour, first.wire].filter(Boolean).join(' '), {
      bold: true,
      room: 84,
    }),
    tagLabel([x.field + 9, near + 15], first.terminal, { size: 12, tone: 'muted', room: 84 }),
  ];
}

/** Away from the signal conductor, whose letters stand next to it. */
function labelBeside(device: Device, [at, middle]: readonly [number, number], side: 1 | -1): Primitive[] {
  const y = middle + (side === 1 ? 12 : -24);
  const rating = ratingOf(device);
  const kind = say(`diagram.kind.${device.kind === 'load' ? device.load : device.kind}`);
  return [
    ...(device.tag ? [tagLabel([at, y - 3], device.tag, { bold: true, room: 74 })] : []),
    rating
      ? tagLabel([at, y + 13], rating, { size: 12, tone: 'muted', room: 100 })
      : wordLabel([at, y + (device.tag ? 13 : 5)], kind, { size: 13, tone: 'muted' }),
  ];
}

/** One branch on one side of the signal. */
function branch(facts: LoopFacts, frame: Frame, side: 1 | -1): Primitive[] {
  const rail = railAt(frame, side);
  const main = facts.point.device;
  const series = inSeries(facts);
  const before = [...fuseInBranch(facts), ...series.map(fieldSymbol)];
  const start = rail - side * wireLength;
  const next = start - side * before.length * eachLength;
  const ordered = (from: number, to: number, symbols: Symbol[]) =>
    side === -1
      ? chain(x.field, from, to, symbols, true)
      : chain(x.field, to, from, [...symbols].reverse(), true);
  const middle = (next + frame.signal) / 2;
  const fused = fuseInBranch(facts).length;
  const yOf = (index: number) => start - side * (index + 0.5) * eachLength;
  return [
    line('wire', [x.field, rail], [x.field, start]),
    ...(before.length > 0 ? ordered(start, next, before) : []),
    ...ordered(next, frame.signal, [fieldSymbol(main)]),
    ...(fused && facts.point.fuse
      ? [tagLabel([x.field + 14, yOf(0) + 4], fuseWords(facts.point.fuse), { size: 12 })]
      : []),
    ...series.flatMap((device, index) => labelBeside(device, [x.field + 32, yOf(index + fused)], side)),
    ...labelBeside(
      main,
      [x.field + (main.kind === 'load' && main.load === 'solenoid' ? 50 : 32), middle],
      side,
    ),
    ...(main.kind === 'ssr-control' ? ssrLoadSide(main, middle) : []),
    ...sideBranches(facts, [middle - 38, middle + 38]),
  ];
}

/** The field side and the x at which its signal conductor begins. */
export function fieldSide(
  facts: LoopFacts,
  frame: Frame,
  mark: string | undefined,
): { draw: Primitive[]; from: number } {
  const conductors = frame.fieldSides.flatMap((side) => poleConductor(facts, frame, side, mark));
  if (facts.field === 'both-poles')
    return { draw: [...threeWireBox(facts, frame), ...conductors], from: x.field + 36 };
  return {
    draw: [...frame.fieldSides.flatMap((side) => branch(facts, frame, side)), ...conductors],
    from: x.field,
  };
}
