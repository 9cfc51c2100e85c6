/** Inputs on alternating current: what a long cable's capacitance lets through, and LEDs that conduct part of a wave. */

/** Reactance of a capacitance, ohm: `1/(2πfC)`. */
export const reactanceOhm = (hz: number, farad: number): number =>
  farad === 0 ? Infinity : 1 / (2 * Math.PI * hz * farad);

export const cableFarad = (pFperM: number, lengthM: number): number => pFperM * lengthM * 1e-12;

/** Volts over an input fed through a capacitance, open contact: `V·R/√(R² + X_C²)`. */
export const voltsThroughCapacitance = (V: number, ohm: number, reactance: number): number =>
  reactance === Infinity ? 0 : (V * ohm) / Math.hypot(ohm, reactance);

/** The resistance at which that voltage is `offV`: `X_C·U/√(V² − U²)`; Infinity when even the supply is no more. */
export const ohmAgainstCapacitance = (V: number, offV: number, reactance: number): number =>
  V <= offV ? Infinity : (reactance * offV) / Math.sqrt(V ** 2 - offV ** 2);

/**
 * R.m.s. current in milliamperes of back-to-back LEDs (or one behind a bridge) with a resistor on a sine of `V` r.m.s.:
 * each half-wave conducts only above the threshold, `I² = (1/πR²)·∫(V̂·sin θ − U)² dθ`.
 * @param thresholdV forward volts, raised by a resistor across the LEDs; a bridge adds its two diodes.
 */
export function ledRmsmA(V: number, ohm: number, thresholdV: number): number {
  const peak = V * Math.SQRT2;
  if (peak <= thresholdV) return 0;
  const start = Math.asin(thresholdV / peak);
  const span = Math.PI - 2 * start;
  const squares =
    peak ** 2 * (span / 2 + Math.sin(2 * start) / 2) -
    4 * peak * thresholdV * Math.cos(start) +
    thresholdV ** 2 * span;
  return (Math.sqrt(Math.max(0, squares) / Math.PI) / ohm) * 1000;
}
