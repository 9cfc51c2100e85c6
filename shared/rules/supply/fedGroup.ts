/** A group with its supply and module, so that each rule starts where its own question starts. */
import type { Module, Supply } from '../../panel/panelSchema';
import type { GroupPlace } from '../context';
import { missing, type Outcome } from '../rule';
import type { Volts } from '../volts';

export interface FedGroup {
  place: GroupPlace;
  module: Module;
  ioPath: string;
  supply: Supply;
  volts: Volts;
}

/** Asks at a group whose module is known; `missing` where its supply is not. */
export function atFedGroup(place: GroupPlace, ask: (at: FedGroup) => Outcome[]): Outcome[] {
  const { module, supply, volts, path } = place;
  if (!module) return [missing(`${path}.module`)];
  if (!supply || !volts) return [missing(`${path}.supply`)];
  return ask({ place, module, ioPath: `modules.${module.tag}.io`, supply, volts });
}
