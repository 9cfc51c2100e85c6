/** The two rails with their poles, where they are measured, and the fuse of the group. */
import type { Fuse } from '../panel/device';
import { railAt, x, type Frame } from './frame';
import type { LoopFacts } from './loopFacts';
import type { Pole } from './poles';
import { box, line, tagLabel, type Primitive } from './primitives';

export const fuseWords = (fuse: Fuse): string => [fuse.tag, `${fuse.A} A`].filter(Boolean).join(' ');

function poleName({ name }: Pole, { supply }: LoopFacts): string {
  if (name === '0 V' || name === 'N' || !supply) return name;
  return name === '+' ? `+${supply.V} V` : `${name} ${supply.V} V`;
}

/** From the left edge to the furthest branch that hangs on it. */
function rail(frame: Frame, side: 1 | -1): Primitive {
  const end = frame.columnSide === side ? x.column : x.field;
  const y = railAt(frame, side);
  return line('wire', [x.rail, y], [end, y]);
}

/** In the positive or line pole: common practice, no source; the panel file does not say which pole the fuse is in. */
function railFuse({ group }: LoopFacts, { top }: Frame): Primitive[] {
  if (!group?.fuse) return [];
  return [
    box([100, top], 32, 15),
    line('thin', [84, top], [116, top]),
    tagLabel([94, top + 24], fuseWords(group.fuse), { anchor: 'middle', size: 12, room: 70 }),
  ];
}

export function rails(facts: LoopFacts, frame: Frame): Primitive[] {
  const { top, bottom } = facts.poles;
  const muted = { size: 11, tone: 'muted' as const };
  const above = frame.railTop
    ? [
        rail(frame, -1),
        tagLabel([x.rail, frame.top - 11], poleName(top, facts), { size: 15, bold: true, room: 108 }),
        tagLabel([x.rail, frame.top + 17], top.terminal ?? '', { ...muted, room: 44 }),
        ...railFuse(facts, frame),
      ]
    : [];
  const below = frame.railBottom
    ? [
        rail(frame, 1),
        tagLabel([x.rail, frame.bottom + 19], poleName(bottom, facts), { size: 15, bold: true, room: 108 }),
        tagLabel([x.rail, frame.bottom - 8], bottom.terminal ?? '', { ...muted, room: 80 }),
      ]
    : [];
  return [...above, ...below];
}
