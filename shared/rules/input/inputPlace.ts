/** An input point with everything an input rule asks, so that each rule starts where its own question starts. */
import type { DigitalInput, OptoInput } from '../../panel/moduleIo';
import type { Group, Point, Supply } from '../../panel/panelSchema';
import type { PointPlace, RuleContext } from '../context';
import { missing, type Outcome } from '../rule';
import { isConnected } from '../spare';
import type { Volts } from '../volts';

export interface InputPlace {
  where: PointPlace['where'];
  path: string;
  point: Point;
  io: DigitalInput | OptoInput;
  ioPath: string;
  group: Group;
  supply: Supply;
  volts: Volts;
  frequencyHz: number;
}

/** An optocoupler lives on AC only when it has LEDs both ways. */
function suitsSupply(io: DigitalInput | OptoInput, { kind }: Supply): boolean {
  const ac = kind !== 'dc';
  return io.kind === 'digital-input' ? (io.current === 'ac') === ac : !ac || io.polarity === 'either';
}

// Every input rule asks at the same places: what they ask is put together once a place.
const known = new WeakMap<PointPlace, InputPlace>();

/** Asks at an input that is wired; answers nothing elsewhere, and `missing` where the supply is unknown. */
export function atInput(
  place: PointPlace,
  context: RuleContext,
  ask: (at: InputPlace) => Outcome[],
): Outcome[] {
  const built = known.get(place);
  if (built) return ask(built);
  const { where, path, point, group, module, supply, volts } = place;
  const io = module?.io;
  if (!group || (io?.kind !== 'digital-input' && io?.kind !== 'opto-input')) return [];
  if (point.spare === true && !isConnected(point)) return [];
  if (!supply || !volts) return [missing(`${group.path}.supply`)];
  const ioPath = `modules.${group.group.module}.io`;
  const { frequencyHz } = context.panel;
  const at = { where, path, point, io, ioPath, group: group.group, supply, volts, frequencyHz };
  known.set(place, at);
  return ask(at);
}

/** The same where the loop can be reckoned: AC on a DC input and the reverse belong to `supply.kind`. */
export const atLoop = (
  place: PointPlace,
  context: RuleContext,
  ask: (at: InputPlace) => Outcome[],
): Outcome[] => atInput(place, context, (at) => (suitsSupply(at.io, at.supply) ? ask(at) : []));

export const isAc = ({ supply }: Pick<InputPlace, 'supply'>): boolean => supply.kind !== 'dc';
