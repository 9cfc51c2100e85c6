/** Supplies that reach a point's terminal besides its group's own. */
import type { Point } from '../panel/panelSchema';

/**
 * The foreign supplies of a point: its `otherSupply` and the load side of its solid-state relays.
 * `null` stands for "nobody has said", which is never none.
 */
export function foreignSupplies(point: Point): (string | null)[] {
  const devices = [point.device, ...(point.series ?? []), ...(point.parallel ?? [])];
  const loads = devices.flatMap((device) => (device.kind === 'ssr-control' ? [device.load.supply] : []));
  if (point.otherSupply === 'none') return loads;
  return [point.otherSupply ?? null, ...loads];
}
