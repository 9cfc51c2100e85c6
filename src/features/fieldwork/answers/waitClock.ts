/** How much of a wait has surely passed: survives a reload, counts only time both clocks agree on. */
import { nowMoment, shortestSince, type Moment } from '../person/elapsed';

interface Kept {
  ms: number;
}

const keyOf = (job: string, step: string, round: string): string => `coldloop.wait ${job} ${round} ${step}`;

function read(key: string): number {
  const ms = Number(sessionStorage.getItem(key));
  return Number.isFinite(ms) && ms > 0 ? ms : 0;
}

/** A running wait. Time in which the page was closed does not count: only the clock of the wall saw it. */
export class WaitClock {
  private readonly key: string;
  private readonly before: Kept;
  private readonly started: Moment = nowMoment();

  constructor(job: string, step: string, round: string) {
    this.key = keyOf(job, step, round);
    this.before = { ms: read(this.key) };
  }

  /** Seconds that have passed by both clocks. */
  passedS(): number {
    const ms = this.before.ms + shortestSince(this.started, nowMoment());
    sessionStorage.setItem(this.key, String(ms));
    return ms / 1000;
  }
}
