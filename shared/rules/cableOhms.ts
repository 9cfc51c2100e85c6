/** What the conductors of a point's cable resist, hot, for sums of voltage drop. */
import { conductorResistance } from '../electrical/conductorResistance';
import { loopDrop } from '../electrical/loopDrop';
import type { Cable } from '../panel/device';

/** Cable is taken at 70 °C for drop (wiring.md). */
const hotC = 70;

/** Ohm per km of one conductor at 70 °C. A class that is not stated counts as fine stranded, which resists more. */
const hotOhmPerKm = (cable: Cable): number =>
  conductorResistance(cable.size, cable.conductor ?? 'class5', hotC);

/** Volts that both conductors keep at a current. */
export const cableDropV = (cable: Cable, A: number): number => loopDrop(A, hotOhmPerKm(cable), cable.lengthM);

/** Ohm of both conductors. */
export const cableLoopOhm = (cable: Cable): number => cableDropV(cable, 1);
