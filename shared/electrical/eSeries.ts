/** The values resistors are made in: E24, IEC 60063. */

// The printed table, not the rounded geometric series: several values differ from it.
const e24 = [
  1.0, 1.1, 1.2, 1.3, 1.5, 1.6, 1.8, 2.0, 2.2, 2.4, 2.7, 3.0, 3.3, 3.6, 3.9, 4.3, 4.7, 5.1, 5.6, 6.2, 6.8,
  7.5, 8.2, 9.1,
] as const;

// Keeps 2.2 × 1000 at 2200 and not at 2200.0000000000005.
const tidy = (ohm: number) => Number(ohm.toPrecision(3));

/** The values of the decade of `ohm`, and the first of the next. */
function decade(ohm: number): number[] {
  const power = 10 ** Math.floor(Math.log10(ohm) + 1e-12);
  return [...e24, 10].map((value) => tidy(value * power));
}

/** The greatest E24 value that is at most `ohm`. @param ohm more than 0. */
export const nextLowerE24 = (ohm: number): number =>
  decade(ohm).findLast((value) => value <= ohm * (1 + 1e-9)) ?? tidy(ohm);

/** The E24 value with the least difference to `ohm`. @param ohm more than 0. */
export const nearestE24 = (ohm: number): number =>
  decade(ohm).reduce((best, value) => (Math.abs(value - ohm) < Math.abs(best - ohm) ? value : best));
