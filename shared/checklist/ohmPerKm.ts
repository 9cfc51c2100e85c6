/** The resistance of a cable's conductor: the one place where the checklist asks the conductor tables. */
import { conductorResistance } from '../electrical/conductorResistance';
import type { Cable } from '../panel/device';

/** Ohm per km at a temperature. A conductor of unstated class is taken as flexible: of the two it resists more. */
export const ohmPerKm = ({ size, conductor = 'class5' }: Cable, tempC: number): number =>
  conductorResistance(size, conductor, tempC);
