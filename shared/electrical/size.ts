/** How big a conductor is: metric cross-section or American wire gauge. */

/** AWG 1/0 to 4/0 are 0 to −3. */
export type Size = { mm2: number } | { awg: number };

/** Diameter of a solid conductor in mm: ASTM B258, `d = 0.127·92^((36−n)/39)`. */
export const awgDiameterMm = (awg: number): number => 0.127 * 92 ** ((36 - awg) / 39);

/** Copper cross-section in mm². */
export const areaMm2 = (size: Size): number =>
  'mm2' in size ? size.mm2 : (Math.PI / 4) * awgDiameterMm(size.awg) ** 2;

/** Gauge number of a cross-section, seldom whole: the inverse of ASTM B258. */
export const gaugeOf = (mm2: number): number =>
  36 - (39 * Math.log(Math.sqrt((4 * mm2) / Math.PI) / 0.127)) / Math.log(92);
