/** What a field device does, in the words the checks need: whether it moves, how a person makes it switch. */
import type { Device } from '../panel/device';
import type { PointFacts } from './facts';

const moving: ReadonlySet<string> = new Set(['solenoid', 'motor', 'coil']);

const loadOf = (device: Device): string | undefined =>
  device.kind === 'load' ? device.load : device.kind === 'ssr-control' ? device.load.load : undefined;

/** Solenoids, motors and coils move something (wiring.md); what hangs on a relay coil nobody knows here. */
export const moves = ({ point }: PointFacts): boolean =>
  [point.device, ...(point.series ?? []), ...(point.parallel ?? [])].some((device) =>
    moving.has(loadOf(device) ?? ''),
  );

export const deviceName = ({ point }: PointFacts): string => point.device.tag ?? point.address;
