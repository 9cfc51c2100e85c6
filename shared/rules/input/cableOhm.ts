/** The resistance of a point's cable when warm. */
import { conductorResistance } from '../../electrical/conductorResistance';
import type { Cable } from '../../panel/device';

// Cable is taken at 70 °C for drop (wiring.md, worst case always).
const hotC = 70;

/** One conductor, ohm. Of an unstated class the flexible one: it resists more. */
export const coreOhm = ({ size, conductor = 'class5', lengthM }: Cable): number =>
  (conductorResistance(size, conductor, hotC) * lengthM) / 1000;
