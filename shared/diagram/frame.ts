/** Where the parts of a loop stand: two rails, the field side at the left, the terminal, the module at the right. */
import type { LoopFacts } from './loopFacts';

export const width = 344;
export const x = { rail: 12, field: 132, terminal: 234, side: 262, column: 300 } as const;

export interface Frame {
  top: number;
  signal: number;
  bottom: number;
  height: number;
  /** True when the module's common hangs on the lower rail. */
  columnDown: boolean;
  /** +1 when the module's column goes down from the signal, −1 when it goes up. */
  columnSide: 1 | -1;
  /** On which side of the signal the field side hangs; both for a three-wire sensor. */
  fieldSides: (1 | -1)[];
  railTop: boolean;
  railBottom: boolean;
}

const headRoom = 44;
const footRoom = 30;
const columnLength = 118;
/** Half a three-wire sensor's box and the wire to its pole. */
export const threeWireLength = 104;
/** Where nothing hangs, terminal and labels still need this much. */
const bareLength = 46;

/** @param fieldLength how long the field side is from its rail to the signal. */
export function frameOf(facts: LoopFacts, fieldLength: number): Frame {
  const columnDown = facts.poles.common === 'bottom';
  const columnSide = columnDown ? 1 : -1;
  const fieldSides: (1 | -1)[] =
    facts.field === 'both-poles' ? [-1, 1] : [facts.field === 'own-loop' ? columnSide : columnDown ? -1 : 1];
  const lengthOf = (side: 1 | -1) =>
    Math.max(bareLength, columnSide === side ? columnLength : 0, fieldSides.includes(side) ? fieldLength : 0);
  const signal = headRoom + lengthOf(-1);
  const bottom = signal + lengthOf(1);
  return {
    top: headRoom,
    signal,
    bottom,
    height: bottom + footRoom,
    columnDown,
    columnSide,
    fieldSides,
    railTop: !columnDown || fieldSides.includes(-1),
    railBottom: columnDown || fieldSides.includes(1),
  };
}
export const railAt = (frame: Frame, side: 1 | -1): number => (side === 1 ? frame.bottom : frame.top);
