/** What a cable keeps of the voltage, there and back. */
import type { Cable } from '../panel/device';

export const cableDrop = (_cable: Cable | undefined, _A: number): number => 0;
