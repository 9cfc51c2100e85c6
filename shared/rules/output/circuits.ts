/** What a point switches: its own loads, and behind a solid-state relay that relay's load on its own supply. */
import type { Suppressor } from '../../panel/device';
import type { DigitalOutput } from '../../panel/moduleIo';
import type { Supply } from '../../panel/panelSchema';
import type { RuleContext } from '../context';
import { missing, type Outcome } from '../rule';
import type { Volts } from '../volts';
import { drawnLoads, type DrawnLoad } from './drawnLoads';
import type { OutputPlace } from './outputPlace';

export interface Circuit {
  /** `relay`: the load side of a solid-state relay. */
  side: 'point' | 'relay';
  switchedBy: DigitalOutput['technology'] | 'ssr';
  supply: Supply;
  volts: Volts;
  loads: readonly DrawnLoad[];
  suppressor?: Suppressor;
  suppressorPath: string;
  /** What the module has built in across its output. */
  builtIn?: NonNullable<DigitalOutput['suppression']>;
  builtInPath: string;
  leakmA?: number;
  leakPath: string;
  onDropV?: number;
  onDropPath: string;
}

const moving: ReadonlySet<string> = new Set(['solenoid', 'motor', 'coil']);

function ownCircuit({ place, path, io, ioPath, supply, volts }: OutputPlace): Circuit {
  const { suppressor } = place.point;
  return {
    side: 'point',
    switchedBy: io.technology,
    supply,
    volts,
    loads: drawnLoads(place),
    ...(suppressor && { suppressor }),
    suppressorPath: `${path}.suppressor`,
    ...(io.suppression && { builtIn: io.suppression }),
    builtInPath: `${ioPath}.suppression`,
    ...(io.leakmA !== undefined && { leakmA: io.leakmA }),
    leakPath: `${ioPath}.leakmA`,
    ...(io.onDropV !== undefined && { onDropV: io.onDropV }),
    onDropPath: `${ioPath}.onDropV`,
  };
}

function relayCircuit({ place, path }: OutputPlace, context: RuleContext): Circuit | Outcome | undefined {
  const { device } = place.point;
  if (device.kind !== 'ssr-control') return undefined;
  const { load, rating, tag } = device;
  const fed = context.supplies.get(load.supply);
  if (!fed) return missing(`${path}.device.load.supply`);
  const { suppressor, supply: _, ...rest } = load;
  return {
    side: 'relay',
    switchedBy: 'ssr',
    supply: fed.supply,
    volts: fed.volts,
    loads: [
      {
        ...rest,
        ...(tag !== undefined && { tag }),
        path: `${path}.device.load`,
        polarised: load.reversed !== undefined,
        moves: moving.has(load.load),
      },
    ],
    ...(suppressor && { suppressor }),
    suppressorPath: `${path}.device.load.suppressor`,
    builtIn: 'none',
    builtInPath: `${path}.device.load.suppressor`,
    ...(rating.leakmA !== undefined && { leakmA: rating.leakmA }),
    leakPath: `${path}.device.rating.leakmA`,
    ...(rating.dropV !== undefined && { onDropV: rating.dropV }),
    onDropPath: `${path}.device.rating.dropV`,
  };
}

/** Asks once for each circuit that the point switches. */
export function inCircuits(
  at: OutputPlace,
  context: RuleContext,
  ask: (circuit: Circuit) => Outcome[],
): Outcome[] {
  const relay = relayCircuit(at, context);
  const own = ask(ownCircuit(at));
  if (relay === undefined) return own;
  return [...own, ...(typeof relay === 'object' && 'side' in relay ? ask(relay) : [relay])];
}

export const currentOf = ({ supply }: Circuit): 'ac' | 'dc' => (supply.kind === 'dc' ? 'dc' : 'ac');
/** Coils: they answer a switched-off current with a spike. */
export const isCoil = ({ load }: DrawnLoad): boolean =>
  load === 'coil' || load === 'solenoid' || load === 'motor';
export const loadsA = ({ loads }: Circuit): number => loads.reduce((sum, { A }) => sum + A, 0);
