/** The loads on an output's terminal, the control side of a solid-state relay among them, in one shape. */
import type { Device, DeviceOf } from '../../panel/device';
import type { LoadOf } from '../../electrical/inrush';
import type { PointPlace } from '../context';
import { isConnected } from '../spare';

export interface DrawnLoad extends Omit<DeviceOf<'load'>, 'kind' | 'load'> {
  load: LoadOf;
  /** Path of the device in the panel file. */
  path: string;
  /** What it moves when it switches: solenoids, motors and coils (wiring.md). */
  moves: boolean;
}

const moving: ReadonlySet<string> = new Set(['solenoid', 'motor', 'coil']);

function drawn(device: Device, path: string): DrawnLoad[] {
  if (device.kind === 'load') {
    const { kind: _, ...load } = device;
    return [{ ...load, path, moves: moving.has(device.load) }];
  }
  if (device.kind !== 'ssr-control') return [];
  const { Vmin, mA, polarised, reversed, tag, load } = device;
  return [
    {
      path,
      load: 'control',
      V: Vmin,
      A: mA / 1000,
      current: polarised ? 'dc' : 'ac',
      polarised,
      ...(reversed !== undefined && { reversed }),
      ...(tag !== undefined && { tag }),
      moves: moving.has(load.load),
    },
  ];
}

// Most output rules ask for them: put together once a place.
const known = new WeakMap<PointPlace, readonly DrawnLoad[]>();

/** The point's device and those in parallel with it. Devices in series are contacts and drops, not loads. */
export function drawnLoads(place: PointPlace): readonly DrawnLoad[] {
  const reckoned = known.get(place);
  if (reckoned) return reckoned;
  const { point, path } = place;
  const loads = [
    ...drawn(point.device, `${path}.device`),
    ...(point.parallel ?? []).flatMap((device, index) => drawn(device, `${path}.parallel.${index}`)),
  ];
  known.set(place, loads);
  return loads;
}

/** A spare terminal with nothing on it. */
export const isUnused = ({ point }: PointPlace): boolean => point.spare === true && !isConnected(point);

/**
 * Steady current that the point switches, in A.
 * @returns undefined when nobody has said what hangs on the terminal; 0 on a spare terminal.
 */
export function steadyA(place: PointPlace): number | undefined {
  const loads = drawnLoads(place);
  if (loads.length > 0) return loads.reduce((sum, load) => sum + load.A, 0);
  return isUnused(place) ? 0 : undefined;
}

export const movesAnything = (place: PointPlace): boolean => drawnLoads(place).some(({ moves }) => moves);
