/** The resistance of a cable's conductor: the one place where the checklist will ask the conductor tables. */
import type { Cable } from '../panel/device';

/** Ohm per km at a temperature. Undefined for every cable while the tables are not there: steps then carry no limit that hangs on it. */
export const ohmPerKm = (_cable: Cable, _tempC: number): number | undefined => undefined;
