/** Devices through which nothing is measured: a tester can neither prove nor spare them. */
import type { Device } from '../../../panel/device';

const mechanical: ReadonlySet<string> = new Set(['contact', 'rtd', 'thermocouple']);

/** Anything with a semiconductor in it; an LED or electronic load too. */
export const isElectronic = (device: Device): boolean =>
  device.kind === 'load' ? ['led', 'electronic'].includes(device.load) : !mechanical.has(device.kind);
