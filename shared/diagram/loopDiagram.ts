/** The computed loop of one point as a picture: supply, fuse, field device, cable, terminal, module, common. */
import type { Panel } from '../panel/panelSchema';
import type { Text } from '../panel/says';
import { acrossModule, foreignFeed, screenMark } from './acrossModule';
import { fieldLength, fieldSide } from './fieldSide';
import { frameOf, width } from './frame';
import { loopFacts } from './loopFacts';
import { loopNotes } from './loopNotes';
import { placeMarks, type PlaceMark } from './placeMarks';
import { moduleColumn } from './moduleColumn';
import type { Primitive } from './primitives';
import { rails } from './rails';
import { terminalBlock } from './terminalBlock';

export interface LoopPicture {
  width: number;
  height: number;
  shapes: Primitive[];
  /** Lines to stand under the picture: cable, fuses, foreign voltage, what the loop computes to. */
  notes: Text[];
}

export interface LoopOptions {
  /** Role of the conductor in question, drawn thick. */
  mark?: string;
  /** Signs to set where a finding is. */
  marks?: PlaceMark[];
}

/**
 * @param address of the point.
 * @returns undefined when the panel holds no such point.
 */
export function loopDiagram(
  panel: Panel,
  address: string,
  options: LoopOptions = {},
): LoopPicture | undefined {
  const facts = loopFacts(panel, address);
  if (!facts) return undefined;
  const frame = frameOf(facts, fieldLength(facts));
  const field = fieldSide(facts, frame, options.mark);
  const shapes = [
    ...rails(facts, frame),
    ...moduleColumn(facts, frame),
    ...acrossModule(facts, frame),
    ...foreignFeed(facts, frame),
    ...field.draw,
    ...screenMark(facts, frame, field.from, options.mark === 'screen'),
    ...terminalBlock(facts, frame, field.from, options.mark === 'signal'),
    ...placeMarks(frame, options.marks ?? []),
  ];
  return { width, height: frame.height, shapes, notes: loopNotes(panel, facts) };
}
