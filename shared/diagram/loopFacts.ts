/** What hangs together at one point of a panel, as its loop is drawn and said. */
import type { Device } from '../panel/device';
import type { ConductorRole, Group, Module, Panel, Point, Supply } from '../panel/panelSchema';
import { polesOfLoop, type Poles } from './poles';

export interface LoopFacts {
  point: Point;
  group: Group | undefined;
  module: Module | undefined;
  supply: Supply | undefined;
  poles: Poles;
  output: boolean;
  /** How the field side hangs on: between a pole and the signal, on both poles and the signal, or on the signal and the common alone. */
  field: 'other-pole' | 'both-poles' | 'own-loop';
  dc: boolean;
}

const threeWire: ReadonlySet<Device['kind']> = new Set(['npn', 'pnp', 'push-pull']);
const ownLoop: ReadonlySet<Device['kind']> = new Set(['rtd', 'thermocouple', 'namur']);

function fieldOf(device: Device, module: Module | undefined): LoopFacts['field'] {
  if (threeWire.has(device.kind)) return 'both-poles';
  if (ownLoop.has(device.kind)) return 'own-loop';
  const io = module?.io;
  if (io?.kind === 'analogue-output') return 'own-loop';
  if (device.kind !== 'transmitter') return 'other-pole';
  if (device.wires !== 2) return 'both-poles';
  return io?.kind === 'analogue-input' && io.powersLoop ? 'own-loop' : 'other-pole';
}

/** @returns undefined when the panel has no such point. */
export function loopFacts(panel: Panel, address: string): LoopFacts | undefined {
  const point = panel.points.find((each) => each.address === address);
  if (!point) return undefined;
  const group = panel.groups.find(({ tag }) => tag === point.group);
  const module = panel.modules.find(({ tag }) => tag === group?.module);
  const supply = panel.supplies.find(({ tag }) => tag === group?.supply);
  return {
    point,
    group,
    module,
    supply,
    poles: polesOfLoop(group, supply),
    output: module?.io.kind === 'digital-output' || module?.io.kind === 'analogue-output',
    field: fieldOf(point.device, module),
    dc: supply?.kind === 'dc',
  };
}

/** The conductors of a point that have this role, the point's own wire standing for a signal nobody lists. */
export function wiresOf(point: Point, roles: readonly ConductorRole[]) {
  const listed = (point.conductors ?? []).filter(({ role }) => roles.includes(role));
  const own = (point.conductors ?? []).some(({ terminal }) => terminal === point.terminal);
  if (!roles.includes('signal') || own) return listed;
  return [
    { role: 'signal' as const, wire: point.wire, terminal: point.terminal, colour: undefined },
    ...listed,
  ];
}
