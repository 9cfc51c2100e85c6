/** Devices, inputs and gaps for the tables of the input rules. */
import type { Device, DeviceOf } from '../../../shared/panel/device';
import type { Panel } from '../../../shared/panel/panelSchema';
import { dcInput, dcSupply, optoInput } from './inputPanel';

export const three = { dropV: 2, leakmA: 0.1, maxmA: 200, supplymA: 10 };
export const npn: Device = { kind: 'npn', ...three };
export const pnp: Device = { kind: 'pnp', ...three };
export const twoWire = (more: Partial<DeviceOf<'two-wire'>> = {}): DeviceOf<'two-wire'> => ({
  kind: 'two-wire',
  current: 'dc',
  dropV: 4,
  leakmA: 0.5,
  minmA: 2,
  maxmA: 100,
  ...more,
});
export const acTwoWire = (more: Partial<DeviceOf<'two-wire'>> = {}) =>
  twoWire({ current: 'ac', dropV: 8, leakmA: 0.1, minmA: 3, ...more });
export const noTolerance = (supply = dcSupply()) => {
  const { tolerance: _, ...rest } = supply;
  return rest;
};
export const without = <T extends object, K extends keyof T>(whole: T, key: K): Omit<T, K> => {
  const { [key]: _, ...rest } = whole;
  return rest;
};
export const noCable = (panel: Panel): Panel => ({
  ...panel,
  points: panel.points.map((point) => without(point, 'cable')),
});
export const unknownSupply = (panel: Panel): Panel => ({
  ...panel,
  groups: panel.groups.map((one) => without(one, 'supply')),
});
// 3 kΩ of type 3: on from 11 V, off to 5 V, off to 1.5 mA within 11 V.
export const bare = dcInput();
export const ctr = { minPct: 50, loadOhm: 4700, logicV: 5, vceSat: 0.4, agePct: 50 };
// 0.979 mA are asked for; at 20.4 V, 1.5 V forward and 30 m of 0.75 mm² the LED gets 8.58 mA, of which a quarter counts.
export const opto = optoInput();

/** `expected` per panel: what triggers it, what just does not, what cannot be said. */
export interface Case {
  rule: string;
  name: string;
  panel: Panel;
  expected: string;
}
