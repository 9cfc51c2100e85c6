/** Standard fuse and breaker ratings, and the current that surely opens a fuse. */

// The preferred numbers of IEC 60127 (up to 10 A) and IEC 60269 / IEC 60898-1 (above); from memory.
export const standardFuses: readonly number[] = [
  0.1, 0.125, 0.16, 0.2, 0.25, 0.315, 0.4, 0.5, 0.63, 0.8, 1, 1.25, 1.6, 2, 2.5, 3.15, 4, 5, 6, 6.3, 8, 10,
  13, 16, 20, 25, 32, 40, 50, 63, 80, 100,
];

/** Loads that stay on: the fuse carries 1.25 times their current (NEC 210.20; elsewhere common practice). */
export const continuousFactor = 1.25;

/** A fuse upstream should be this many times the one downstream, so that only the near one opens (common practice, no source). */
export const selectivityRatio = 1.6;

/** The smallest standard rating that is at least this, in A; undefined above the list. */
export const fuseAtLeast = (A: number): number | undefined => standardFuses.find((size) => size >= A - 1e-9);

/** The largest standard rating that is at most this, in A; undefined below the list. */
export const fuseAtMost = (A: number): number | undefined =>
  standardFuses.filter((size) => size <= A + 1e-9).at(-1);

export type FuseKind = 'gG' | 'miniature-F' | 'miniature-T' | 'breaker';

/** I₂ of IEC 60364-4-43: what surely opens the device, in A. Fuses 2.1/1.9/1.6 times (from memory), breakers 1.45 times. */
export function surelyOpensA(A: number, kind: FuseKind | undefined): number {
  if (kind === 'breaker') return 1.45 * A;
  if (A <= 4) return 2.1 * A;
  return (A < 16 ? 1.9 : 1.6) * A;
}

/** Whether a device protects a conductor: I_n ≤ I_z and I₂ ≤ 1.45·I_z (IEC 60364-4-43). */
export const protectsWire = (A: number, kind: FuseKind | undefined, ampacityA: number): boolean =>
  A <= ampacityA && surelyOpensA(A, kind) <= 1.45 * ampacityA * (1 + 1e-9);
