/** Whether anything hangs on a terminal that the file calls spare. */
import type { Point } from '../panel/panelSchema';

/** A spare point must still name a device: a plain contact without a name is the placeholder. */
export const isConnected = (point: Point): boolean =>
  point.device.kind !== 'contact' ||
  point.device.tag !== undefined ||
  (point.conductors ?? []).length > 0 ||
  (point.series ?? []).length > 0 ||
  (point.parallel ?? []).length > 0 ||
  [point.cable, point.fuse, point.suppressor, point.bleeder].some((part) => part !== undefined) ||
  (point.otherSupply !== undefined && point.otherSupply !== 'none');
