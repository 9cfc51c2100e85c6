/** The resistance of a cable's conductor, from the standard tables. */
import type { Cable } from '../panel/device';

export const ohmPerKm = (_cable: Cable, _tempC: number): number | undefined => undefined;
