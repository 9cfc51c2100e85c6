/** Resolves at the first Ctrl-C or TERM; further ones are left to the stop that then runs. */
export function untilStopped(): Promise<void> {
  return new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => resolve());
  });
}
