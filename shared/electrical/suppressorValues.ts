/** Which suppressor suits a load. */

/** Recommended reverse rating of a diode across a DC coil, V: ten times the supply (common practice). */
export const diodeRecommendedV = (V: number): number => 10 * V;
/** Under this reverse rating a diode is a finding, V: three times the supply. */
export const diodeLeastV = (V: number): number => 3 * V;
/** Stand-off volts of a TVS or Zener, V: at least the highest supply. */
export const standOffLeastV = (highestV: number): number => highestV;
/** Continuous AC rating of a varistor, V r.m.s.: at least 1.1 times the supply. */
export const movLeastV = (V: number): number => 1.1 * V;

export interface RcRange {
  minOhm: number;
  maxOhm: number;
  minUF: number;
  maxUF: number;
}

/** RC across a load or contact: 0.5 to 1 ohm per volt, 0.5 to 1 µF per ampere (makers' manuals). */
export const rcRange = (V: number, A: number): RcRange => ({
  minOhm: 0.5 * V,
  maxOhm: V,
  minUF: 0.5 * A,
  maxUF: A,
});

/** Current through an RC across an open contact, mA: `2πf·C·U`. */
export const rcLeakmA = (hz: number, uF: number, V: number): number =>
  2 * Math.PI * hz * uF * 1e-6 * V * 1000;
