/** Time that passes only when a test says so, with the timers that wait on it. */
interface Timer {
  at: number;
  run: () => void;
}

export class VirtualClock {
  private steady = 0;
  private wallOffset = Date.parse('2026-12-01T08:00:00Z');
  private readonly timers = new Set<Timer>();

  now = (): number => this.steady + this.wallOffset;
  monotonic = (): number => this.steady;

  /** Sets the wall clock on (or back), as a person can; the steady clock does not notice. */
  setWall(byMs: number): void {
    this.wallOffset += byMs;
  }

  setTimer = (ms: number, run: () => void): (() => void) => {
    const timer = { at: this.steady + ms, run };
    this.timers.add(timer);
    return () => {
      this.timers.delete(timer);
    };
  };

  /** Milliseconds until the next timer; undefined when none waits. */
  nextIn(): number | undefined {
    const ats = [...this.timers].map(({ at }) => at);
    return ats.length > 0 ? Math.min(...ats) - this.steady : undefined;
  }

  /** Passes time, running what falls due in its order. What they start runs on by itself. */
  pass(ms: number): void {
    const end = this.steady + ms;
    for (;;) {
      const [next] = [...this.timers].filter(({ at }) => at <= end).sort((a, b) => a.at - b.at);
      if (!next) break;
      this.timers.delete(next);
      this.steady = Math.max(this.steady, next.at);
      next.run();
    }
    this.steady = end;
  }
}
