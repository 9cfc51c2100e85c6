/** How long stored charge takes to fall through its bleeder. */

/**
 * `t = R·C·ln(V0/V)` in seconds, never below 0.
 * @param startV volts when switched off. @param endV volts to be reached.
 */
export function dischargeSeconds(ohm: number, farad: number, startV: number, endV: number): number {
  return Math.max(0, ohm * farad * Math.log(startV / endV));
}
