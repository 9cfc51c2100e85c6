/** What hangs on a supply, in amperes, as far as the panel file says. */
import { standardInput } from '../../electrical/inputTypes';
import type { Device } from '../../panel/device';
import type { PointPlace, SupplyPlace } from '../context';
import { isConnected } from '../spare';

/** `phase` where the supply has several; `missing` where a current is not stated. */
export type Drawn = { A: number; phase?: string } | { missing: string };

/** What a device takes for itself or switches, A. */
function deviceA(device: Device, path: string): Drawn {
  switch (device.kind) {
    case 'load':
      return { A: device.A };
    case 'ssr-control':
      return { A: device.mA / 1000 };
    case 'npn':
    case 'pnp':
    case 'push-pull':
      return { A: device.supplymA / 1000 };
    case 'transmitter':
      // Two wires: the signal is the supply. Four: it has a supply of its own.
      if (device.wires === 2) return { A: 0.02 };
      if (device.wires === 4) return { A: 0 };
      return device.maxmA === undefined ? { missing: `${path}.maxmA` } : { A: device.maxmA / 1000 };
    default:
      return { A: 0 };
  }
}

/** What the input itself draws through its device, A: the most that its module may. */
function inputA({ module, volts }: PointPlace): Drawn {
  const io = module?.io;
  const V = volts?.maxV ?? 0;
  if (io?.kind === 'opto-input') return { A: V / io.seriesOhm };
  if (io?.kind !== 'digital-input') return { A: 0 };
  if (io.ratedmA !== undefined) return { A: io.ratedmA / 1000 };
  if (io.inputOhm !== undefined) return { A: V / io.inputOhm };
  const range = io.type === 'custom' ? undefined : standardInput(io.V, io.current, io.type);
  return range ? { A: range.mostmA / 1000 } : { missing: `modules.${module?.tag}.io.ratedmA` };
}

function ofPoint(place: PointPlace, phase: string | undefined): Drawn[] {
  const { point, path, volts } = place;
  if (point.spare === true && !isConnected(point)) return [];
  const devices: [Device, string][] = [
    [point.device, `${path}.device`],
    ...(point.series ?? []).map((device, n): [Device, string] => [device, `${path}.series.${n}`]),
    ...(point.parallel ?? []).map((device, n): [Device, string] => [device, `${path}.parallel.${n}`]),
  ];
  const bleeder: Drawn = { A: point.bleeder ? (volts?.maxV ?? 0) / point.bleeder.ohm : 0 };
  const all = [...devices.map(([device, at]) => deviceA(device, at)), inputA(place), bleeder];
  return all
    .filter((drawn) => 'missing' in drawn || drawn.A > 0)
    .map((drawn) => ('A' in drawn && phase !== undefined ? { ...drawn, phase } : drawn));
}

/** Loads of relays that switch this supply. */
const relayA = ({ point }: PointPlace): Drawn[] =>
  point.device.kind === 'ssr-control' ? [{ A: point.device.load.A }] : [];

/** Everything switched on at once. */
export const drawnFrom = ({ groups, relayLoads }: SupplyPlace): Drawn[] => [
  ...groups.flatMap(({ group, points }) => points.flatMap((place) => ofPoint(place, group.phase))),
  ...relayLoads.flatMap(relayA),
];

/** The most that one conductor carries: of a three-phase supply its fullest phase, what names no phase counted to each. */
export function fullestA(drawn: readonly Drawn[], phases: boolean): number {
  const sum = (items: readonly Drawn[]) =>
    items.reduce((total, item) => total + ('A' in item ? item.A : 0), 0);
  if (!phases) return sum(drawn);
  const shared = drawn.filter((item) => 'A' in item && item.phase === undefined);
  const on = (phase: string) => drawn.filter((item) => 'A' in item && item.phase === phase);
  return sum(shared) + Math.max(...['L1', 'L2', 'L3'].map((phase) => sum(on(phase))));
}
