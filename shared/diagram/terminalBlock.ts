/** The terminal of the point and the conductor on it: thick and filled when it is the one in question. */
import { x, type Frame } from './frame';
import { wiresOf, type LoopFacts } from './loopFacts';
import { box, line, tagLabel, type Primitive } from './primitives';
import { figures, loopValues } from './loopValues';
import { fuseWords } from './rails';
import { arrowHead } from './symbols/switches';

/** What stands on the block: the number after the strip's name. */
const number = (terminal: string): string => terminal.slice(terminal.lastIndexOf(':') + 1) || terminal;

/** Which way the current runs in the signal conductor: 1 to the module, −1 to the field, 0 where it alternates or nothing flows by itself. */
function flow({ dc, field, poles, module }: LoopFacts): 1 | -1 | 0 {
  if (!dc || module?.io.kind === 'analogue-output') return dc ? -1 : 0;
  const io = module?.io;
  if (io?.kind === 'analogue-input' && (io.signal === 'rtd' || io.signal === 'thermocouple')) return 0;
  if (field === 'own-loop') return poles.common === 'bottom' ? -1 : 1;
  return poles.common === 'bottom' ? 1 : -1;
}

/** The fuse of a point whose common is at the plus or line: between terminal and load (common practice; the file does not say). */
function fuseInSignal({ point, poles, field }: LoopFacts, { signal }: Frame, from: number): Primitive[] {
  if (!point.fuse || poles.common === 'bottom' || field === 'both-poles') return [];
  return [
    box([from + 20, signal], 26, 13),
    line('thin', [from + 7, signal], [from + 33, signal]),
    tagLabel([from + 4, signal - 12], fuseWords(point.fuse), { size: 12, room: 76 }),
  ];
}

/** What the closed loop carries, under or over the number of the wire. */
function currentLabel(facts: LoopFacts, { signal, columnSide }: Frame, middle: number): Primitive[] {
  const on = loopValues(facts)?.on;
  // Foreign voltage stands where the current would, and its picture matters more.
  if (!on || facts.point.otherSupply !== 'none') return [];
  const y = columnSide === 1 ? signal + 39 : signal - 41;
  return [
    tagLabel([middle, y], `${figures(on.mA)} mA`, {
      anchor: 'middle',
      size: 12,
      room: facts.field === 'both-poles' ? 44 : 62,
    }),
  ];
}

/** The conductor from the field side, which ends at `from`, to the terminal. */
export function terminalBlock(facts: LoopFacts, frame: Frame, from: number, marked: boolean): Primitive[] {
  const { signal, columnSide } = frame;
  const [wire] = wiresOf(facts.point, ['signal']);
  const edge = x.terminal - 20;
  const fused = fuseInSignal(facts, frame, from);
  const middle = fused.length > 0 ? from + 56 : (from + edge) / 2 + 2;
  const direction = flow(facts);
  const room = edge - from - 2;
  const labelY = signal - columnSide * 24 + (columnSide === 1 ? 0 : 10);
  return [
    line(marked ? 'thick' : 'wire', [from, signal], [edge, signal]),
    ...(direction === 0
      ? []
      : [arrowHead([middle + direction * 8, signal], [direction, 0], marked ? 17 : 12)]),
    tagLabel(
      [middle, columnSide === 1 ? signal + 23 : signal - (fused.length > 0 ? 27 : 25)],
      wire?.wire ?? '',
      {
        anchor: 'middle',
        size: 12,
        tone: 'muted',
        room,
      },
    ),
    tagLabel([middle, signal - 11], wire?.colour ?? '', { anchor: 'middle', bold: true, room }),
    ...currentLabel(facts, frame, middle),
    ...fused,
    box([x.terminal, signal], 40, 34, marked ? 'ink' : 'sheet'),
    tagLabel([x.terminal, signal + 5], number(facts.point.terminal), {
      anchor: 'middle',
      size: 15,
      bold: true,
      room: 36,
      tone: marked ? 'onInk' : 'ink',
    }),
    tagLabel([x.terminal - 20, labelY], facts.point.terminal, { bold: true, room: 54 }),
  ];
}
