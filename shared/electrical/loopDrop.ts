/** The volts a cable keeps. */

export type Circuit = 'dc' | 'ac1' | 'ac3';

/**
 * Volts: `2·I·R′·l` for DC and single phase, `√3·I·R′·l` for three phases.
 * @param ohmPerKm of one conductor, hot. @param lengthM one way.
 */
export const loopDrop = (A: number, ohmPerKm: number, lengthM: number, circuit: Circuit = 'dc'): number =>
  ((circuit === 'ac3' ? Math.sqrt(3) : 2) * A * ohmPerKm * lengthM) / 1000;
