/** Does something now and again every so often; never twice at once. */

export interface Repeated {
  start: () => void;
  /** Ends when the run that is going on has ended. */
  stop: () => Promise<void>;
}

/** @param act must not throw for what it finds; a rejection ends the repetition of that run only. */
export function repeatedly(everyMs: number, act: () => Promise<void>): Repeated {
  let timer: NodeJS.Timeout | undefined;
  let running: Promise<void> = Promise.resolve();
  const run = () => {
    running = running.then(act).catch(() => undefined);
  };
  return {
    start: () => {
      run();
      timer = setInterval(run, everyMs);
      timer.unref();
    },
    stop: async () => {
      clearInterval(timer);
      await running;
    },
  };
}
