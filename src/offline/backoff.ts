/** When the sender tries again by itself. */
export const minWaitMs = 1_000;
// sync.md: full jitter between 1 s and 5 min, so that phones leaving a dead zone together do not knock together.
export const maxWaitMs = 300_000;

/** Full jitter under a ceiling that doubles with each failure in a row; never under a second. */
export function backoffMs(failures: number, random: number): number {
  const ceiling = Math.min(maxWaitMs, minWaitMs * 2 ** Math.min(failures, 20));
  return Math.max(minWaitMs, random * ceiling);
}
