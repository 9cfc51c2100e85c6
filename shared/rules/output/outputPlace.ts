/** An output point with everything an output rule asks, so that each rule starts where its own question starts. */
import type { DigitalOutput } from '../../panel/moduleIo';
import type { Module, Supply } from '../../panel/panelSchema';
import type { GroupPlace, PointPlace } from '../context';
import { missing, type Outcome } from '../rule';
import type { Volts } from '../volts';

interface Fed {
  io: DigitalOutput;
  ioPath: string;
  module: Module;
  supply: Supply;
  volts: Volts;
}
export interface OutputPlace extends Fed {
  place: PointPlace;
  path: string;
  group: GroupPlace;
}
export interface OutputGroup extends Fed {
  place: GroupPlace;
}

// Every output rule asks at the same places: what they ask is put together once a place.
const known = new WeakMap<PointPlace, OutputPlace>();

/** Asks at a point of a digital output; answers nothing elsewhere, and `missing` where the supply is unknown. */
export function atOutput(place: PointPlace, ask: (at: OutputPlace) => Outcome[]): Outcome[] {
  const built = known.get(place);
  if (built) return ask(built);
  const { group, module, supply, volts, path } = place;
  if (!group || module?.io.kind !== 'digital-output') return [];
  if (!supply || !volts) return [missing(`${group.path}.supply`)];
  const ioPath = `modules.${module.tag}.io`;
  const at = { place, path, group, module, io: module.io, ioPath, supply, volts };
  known.set(place, at);
  return ask(at);
}

/** The same for a group of digital outputs. */
export function atOutputGroup(place: GroupPlace, ask: (at: OutputGroup) => Outcome[]): Outcome[] {
  const { module, supply, volts, path } = place;
  if (module?.io.kind !== 'digital-output') return [];
  if (!supply || !volts) return [missing(`${path}.supply`)];
  return ask({ place, module, io: module.io, ioPath: `modules.${module.tag}.io`, supply, volts });
}

/** Outputs that switch with a semiconductor: they leak, they need a load, and a spike kills them. */
export const isSemiconductor = ({ technology }: DigitalOutput): boolean => technology !== 'relay';
