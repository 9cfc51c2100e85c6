/** Charge left in a capacitor and how it goes. */

/** Seconds from `startV` to `endV` through a resistor: `R·C·ln(V0/V)`, never below 0. */
export const dischargeS = (ohm: number, farad: number, startV: number, endV: number): number =>
  startV <= endV ? 0 : ohm * farad * Math.log(startV / endV);

/** Volts left after `seconds`. */
export const voltsAfter = (ohm: number, farad: number, startV: number, seconds: number): number =>
  startV * Math.exp(-seconds / (ohm * farad));

/** The greatest resistor that reaches `endV` in time, ohm. */
export const dischargeOhm = (farad: number, startV: number, endV: number, seconds: number): number =>
  seconds / (farad * Math.log(startV / endV));

/** Stored energy, J. */
export const storedJ = (farad: number, V: number): number => (farad * V ** 2) / 2;

/** The capacitance that holds a charge, F: IEC 60204-1 6.2.4 exempts 60 µC. */
export const faradHolding = (coulomb: number, V: number): number => coulomb / V;
