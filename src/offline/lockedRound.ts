/** One sending round at a time over all tabs: a Web Lock held for the round, never a tab that leads for ever. */

// A frozen tab keeps its lock and sends nothing. A round has requests of 20 s; after this long without any
// luck the lock is taken over. Two rounds at once do no harm: what the server holds it acknowledges again.
const stuckMs = 300_000;

/** @returns a function that runs while holding the named lock; false, without running, when another tab holds it */
export function lockedRound(
  locks: LockManager | undefined,
  monotonic: () => number,
): (name: string, run: () => Promise<void>) => Promise<boolean> {
  let refusedSince: number | null = null;
  const runLocked = (locked: LockManager, name: string, options: LockOptions, run: () => Promise<void>) =>
    locked.request(name, options, async (lock) => {
      if (!lock) return false;
      refusedSince = null;
      await run();
      return true;
    });
  return async (name, run) => {
    if (!locks) {
      await run();
      return true;
    }
    const isStuck = refusedSince !== null && monotonic() - refusedSince > stuckMs;
    const ran = await runLocked(locks, name, isStuck ? { steal: true } : { ifAvailable: true }, run);
    if (!ran) refusedSince ??= monotonic();
    return ran;
  };
}
