/** What a cable keeps of the voltage, there and back, hot. */
import { loopDrop } from '../electrical/loopDrop';
import type { Cable } from '../panel/device';
import { ohmPerKm } from './ohmPerKm';

// Cable is taken at 70 °C for drop (wiring.md, worst case always).
const hotC = 70;

/** Volts lost in both conductors at this current; 0 where no cable is stated. */
export const cableDrop = (cable: Cable | undefined, A: number): number =>
  cable ? loopDrop(A, ohmPerKm(cable, hotC), cable.lengthM) : 0;
