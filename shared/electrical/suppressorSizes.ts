/** What a suppressor across a coil or a contact must be. */

export interface Range {
  low: number;
  high: number;
}

/** Reverse rating of a diode: under three times the supply it is too small, ten times is recommended (reference §8). */
export const diodeLeastTimes = 3;
export const diodeWantedTimes = 10;

/** RC: 0.5 to 1 ohm per volt, 0.5 to 1 µF per ampere (reference §8, three makers' manuals). */
export const rcOhm = (V: number): Range => ({ low: 0.5 * V, high: V });
export const rcMicrofarad = (A: number): Range => ({ low: 0.5 * A, high: A });

/** Least continuous AC rating of a varistor: 1.1 times the nominal voltage, and never below the highest (V r.m.s.). */
export const varistorLeastV = (nominalV: number, maxV: number): number => Math.max(1.1 * nominalV, maxV);

/** Least stand-off of a TVS or zener: above the peak that it sees in service. */
export const standOffLeastV = (maxV: number, current: 'ac' | 'dc'): number =>
  current === 'dc' ? maxV : Math.SQRT2 * maxV;
