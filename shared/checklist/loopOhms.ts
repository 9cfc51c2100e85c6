/** The resistance that a cable's two conductors should show, end to end and back. */
import type { Cable } from '../panel/device';

export interface ExpectedOhms {
  ohm: number;
  ohmPerKm: number;
  low: number;
  high: number;
}
export const loopOhms = (_cable: Cable): ExpectedOhms | undefined => undefined;
