/** What a cable keeps of the voltage, there and back, hot. */
import type { Cable } from '../panel/device';
import { ohmPerKm } from './ohmPerKm';

// Cable is taken at 70 °C for drop (wiring.md, worst case always).
const hotC = 70;

/** Volts lost in both conductors at this current; 0 where no cable is stated, undefined where its size has no known resistance. */
export function cableDrop(cable: Cable | undefined, A: number): number | undefined {
  if (!cable) return 0;
  const perKm = ohmPerKm(cable, hotC);
  return perKm === undefined ? undefined : (2 * A * perKm * cable.lengthM) / 1000;
}
