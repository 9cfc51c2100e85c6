/** A resistor across an input: it leads a leakage past it, or gives a sensor its least load. */
import { nextLowerE24 } from './eSeries';
import { ratingFor } from './resistorWatts';

export interface Bleeder {
  /** The greatest resistance that does it, ohm. */
  atMostOhm: number;
  /** The E24 value to fit, ohm. */
  ohm: number;
  /** What it turns into heat at the highest volts, W. */
  heatW: number;
  /** Rating to buy, W; absent where no common rating is enough. */
  W?: number;
}

const fitted = (atMostOhm: number, highestV: number): Bleeder => {
  const ohm = nextLowerE24(atMostOhm);
  const heatW = highestV ** 2 / ohm;
  const W = ratingFor(heatW);
  return { atMostOhm, ohm, heatW, ...(W !== undefined && { W }) };
};

/**
 * The resistor that keeps an input off: `R ≤ U_off/(I_leak − I_in)`. The off volts stand in the numerator, never the supply's.
 * @param inputmA what the input itself takes at the off volts; 0 where nobody knows.
 * @returns undefined when the input alone takes the leakage.
 */
export function leakageBleeder(off: {
  offV: number;
  leakmA: number;
  inputmA: number;
  highestV: number;
}): Bleeder | undefined {
  const restmA = off.leakmA - off.inputmA;
  return restmA > 0 ? fitted((off.offV / restmA) * 1000, off.highestV) : undefined;
}

/**
 * The resistor that gives a two-wire sensor its least current: `R ≤ V_in/(I_min − I_in)`, at the lowest volts.
 * @returns undefined when the input alone draws enough.
 */
export function loadBleeder(on: {
  lowestV: number;
  minmA: number;
  inputmA: number;
  highestV: number;
}): Bleeder | undefined {
  const lackmA = on.minmA - on.inputmA;
  return lackmA > 0 && on.lowestV > 0 ? fitted((on.lowestV / lackmA) * 1000, on.highestV) : undefined;
}

/** The resistor for a resistance that was reckoned otherwise (cable capacitance, the stricter of two needs). */
export const bleederAtMost = (atMostOhm: number, highestV: number): Bleeder => fitted(atMostOhm, highestV);

export const parallel = (a: number, b: number): number =>
  a === Infinity ? b : b === Infinity ? a : (a * b) / (a + b);
