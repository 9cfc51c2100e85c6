/** A point of an analogue input with its module's data. */
import type { AnalogueInput } from '../../panel/moduleIo';
import type { Module } from '../../panel/panelSchema';
import type { GroupPlace, PointPlace } from '../context';
import { isUnused } from '../output/drawnLoads';
import type { Outcome } from '../rule';

export interface AnaloguePlace {
  place: PointPlace;
  path: string;
  io: AnalogueInput;
  ioPath: string;
  module: Module;
  group: GroupPlace;
}

/** Asks at a point of an analogue input with something on it; answers nothing elsewhere. */
export function atAnalogueInput(place: PointPlace, ask: (at: AnaloguePlace) => Outcome[]): Outcome[] {
  const { module, group, path } = place;
  if (module?.io.kind !== 'analogue-input' || !group || isUnused(place)) return [];
  return ask({ place, path, io: module.io, ioPath: `modules.${module.tag}.io`, module, group });
}

/** Signals that are a current through the input. */
export const isLoop = ({ signal }: AnalogueInput): boolean => signal === '4-20mA' || signal === '0-20mA';
