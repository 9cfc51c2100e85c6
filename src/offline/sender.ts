/** Decides when a sending round runs: on a wake, a new entry, a request, or its own timer. */
import { backoffMs, minWaitMs } from './backoff';
import type { DeviceEnvironment } from './environment';
import type { RoundOutcome } from './roundOutcome';
import type { RoundScope } from './sendingRound';
import type { SendState } from './types';

// sync.md: open screens are refreshed every 5 s; failures.md row 22: all else every minute while visible.
const watchedMs = 5_000;
const visibleMs = 60_000;
// Beyond an hour a Retry-After is taken for a fault of whoever wrote it.
const maxRetryAfterMs = 3_600_000;
// While in the background the timer alone may wait as long as the back-off may: 2^9 s is above its top.
const idleFailures = 9;
/** A new entry waits this long, so that sending does not compete with saving the next one. */
export const beatMs = 400;
const lockName = 'coldloop-sending';

export interface SenderHooks {
  /** Nothing is sent or pulled before somebody is enrolled here. */
  wanted(): Promise<boolean>;
  round(scope: RoundScope): Promise<RoundOutcome>;
  watched(): string[];
  /** The state in memory has changed. */
  told(): void;
}

/** The store itself failed: nothing was removed, so the same round can be tried again. */
const storeFault = (error: unknown): RoundOutcome => ({
  end: 'wait',
  says: {
    key: 'device.store.error.store',
    params: { says: error instanceof Error ? error.message : String(error) },
  },
  retryAfterMs: null,
});

export class Sender {
  state: SendState['state'] = 'idle';
  lastError: SendState['lastError'] = null;
  private failures = 0;
  private notBefore = 0;
  private lastFullAt = -Infinity;
  private running: Promise<void> | null = null;
  private again = false;
  private cancelTimer: (() => void) | null = null;
  private cancelBeat: (() => void) | null = null;
  private readonly fresh = new Set<string>();
  private stopWaking: (() => void) | null = null;

  constructor(
    private readonly env: DeviceEnvironment,
    private readonly hooks: SenderHooks,
  ) {}

  start(): () => void {
    this.stopWaking ??= this.env.onWake(() => void this.trigger());
    void this.trigger();
    return () => {
      this.stop();
    };
  }

  /** Runs nothing more on its own; a round under way ends as it would. */
  stop(): void {
    for (const end of [this.stopWaking, this.cancelTimer, this.cancelBeat]) end?.();
    this.stopWaking = this.cancelTimer = this.cancelBeat = null;
  }

  /** The job has a new entry: sends it in a moment, together with what else comes until then. */
  triggerSoon(job: string): void {
    this.fresh.add(job);
    this.cancelBeat ??= this.env.setTimer(beatMs, () => {
      this.cancelBeat = null;
      const only = [...this.fresh];
      this.fresh.clear();
      void this.trigger({ only });
    });
  }

  /** Runs a whole round, or has the running one followed by another; resolves when that is over. */
  async trigger(scope: RoundScope = {}): Promise<void> {
    if (this.running) {
      this.again = true;
      return this.running;
    }
    const running = this.runRounds(scope).finally(() => {
      this.running = null;
      this.schedule();
    });
    this.running = running;
    return running;
  }

  /** What is watched has changed: the timer may be due sooner. */
  reconsider(): void {
    if (!this.running) this.schedule();
  }

  private async runRounds(scope: RoundScope): Promise<void> {
    this.again = false;
    await this.runOne(scope).catch((error: unknown) => {
      this.settle(storeFault(error));
    });
    if (this.isWantedAgain()) return this.runRounds({});
    this.hooks.told();
  }

  /** Somebody asked while the round ran; where nobody answers, the timer asks again. */
  private isWantedAgain(): boolean {
    return this.again && this.failures === 0;
  }

  private async runOne(scope: RoundScope): Promise<void> {
    if (this.env.monotonic() < this.notBefore || !(await this.hooks.wanted())) return;
    const ran = await this.env.whileLocked(lockName, async () => {
      this.state = 'sending';
      this.hooks.told();
      const outcome = await this.hooks.round(scope).catch(storeFault);
      if (!scope.only) this.lastFullAt = this.env.monotonic();
      this.settle(outcome);
    });
    // Another tab is sending: what it does not take is tried shortly after.
    if (!ran) this.failures = Math.max(this.failures, 1);
  }

  private settle(outcome: RoundOutcome): void {
    const ends = { done: 'idle', refused: 'waiting', wait: 'waiting', 'sign-in': 'needs-sign-in' } as const;
    this.state = ends[outcome.end];
    this.lastError = 'says' in outcome ? outcome.says : null;
    // What is refused is refused again soon: it must not slow down what goes through.
    const reached = outcome.end === 'done' || outcome.end === 'refused';
    this.failures = reached ? 0 : this.failures + 1;
    const wait = outcome.end === 'wait' ? Math.min(outcome.retryAfterMs ?? 0, maxRetryAfterMs) : 0;
    this.notBefore = this.env.monotonic() + wait;
  }

  private waitMs(): number {
    const asked = this.notBefore - this.env.monotonic();
    if (this.failures > 0) return Math.max(asked, backoffMs(this.failures, this.env.random()));
    if (!this.env.isVisible()) return Math.max(visibleMs, backoffMs(idleFailures, this.env.random()));
    return this.hooks.watched().length > 0 ? watchedMs : visibleMs;
  }

  /** The timer runs only between `start` and its end. */
  private schedule(): void {
    this.cancelTimer?.();
    this.cancelTimer = null;
    if (!this.stopWaking) return;
    this.cancelTimer = this.env.setTimer(Math.max(minWaitMs, this.waitMs()), () => {
      const full = this.env.monotonic() - this.lastFullAt >= visibleMs || this.failures > 0;
      void this.trigger(full ? {} : { only: this.hooks.watched() });
    });
  }
}
