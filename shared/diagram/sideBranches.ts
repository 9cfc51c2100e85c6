/** What stands across the field device: parallel devices, a suppressor at the load, a resistor at the load. */
import type { Suppressor } from '../panel/device';
import { fieldSymbol } from './fieldSymbol';
import { x } from './frame';
import type { LoopFacts } from './loopFacts';
import { line, tagLabel, type Primitive } from './primitives';
import { diode, lettered, resistor } from './symbols/diodes';
import { chain, type Symbol } from './symbols/symbol';

interface Side {
  symbol: Symbol;
  label: string;
}

/** Plus is above, so a diode that waits for the coil's kick points up; a reversed one is a short and is drawn so. */
export function suppressorSymbol({ kind, reversed }: Suppressor): Symbol {
  if (kind !== 'diode') return lettered(kind.toUpperCase());
  return { half: diode.half, draw: (at) => diode.draw(at, reversed === true) };
}

export function sidesOf({ point, output }: LoopFacts): Side[] {
  const { suppressor, bleeder } = point;
  return [
    ...(point.parallel ?? []).map((device) => ({ symbol: fieldSymbol(device), label: device.tag ?? '' })),
    ...(suppressor?.at === 'load' && suppressor.kind !== 'none'
      ? [
          {
            symbol: suppressorSymbol(suppressor),
            label: suppressor.V === undefined ? '' : `${suppressor.V} V`,
          },
        ]
      : []),
    ...(output && bleeder ? [{ symbol: resistor, label: ohms(bleeder.ohm) }] : []),
  ];
}

export const ohms = (ohm: number): string =>
  ohm >= 1000 ? `${Number((ohm / 1000).toPrecision(3))} kΩ` : `${Number(ohm.toPrecision(3))} Ω`;

const apart = 46;
const shown = 2;

export function sideBranches(facts: LoopFacts, [from, to]: [number, number]): Primitive[] {
  const sides = sidesOf(facts);
  const drawn = sides.slice(0, shown);
  const more = sides.length - drawn.length;
  return [
    ...drawn.flatMap(({ symbol }, index) => {
      const at = x.field - apart * (index + 1);
      return [
        line('wire', [x.field, from], [at, from]),
        line('wire', [x.field, to], [at, to]),
        ...chain(at, from, to, [symbol], true),
      ];
    }),
    ...(drawn.length === 1 && drawn[0]
      ? [
          tagLabel([x.field - apart - 18, (from + to) / 2 + 4], drawn[0].label, {
            anchor: 'end',
            size: 12,
            room: 54,
          }),
        ]
      : []),
    ...(more > 0 ? [tagLabel([12, (from + to) / 2 + 4], `+${more}`, { bold: true })] : []),
  ];
}
