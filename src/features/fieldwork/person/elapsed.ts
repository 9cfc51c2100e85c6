/** Time between two looks at a device whose clock may jump and whose page may have slept. Milliseconds. */
export interface Moment {
  wall: number;
  mono: number;
}

export const nowMoment = (): Moment => ({ wall: Date.now(), mono: performance.now() });

/** For "at most" rules: the larger of both clocks; a wall clock set back does not shorten it. */
export const longestSince = (then: Moment, now: Moment): number =>
  Math.max(now.wall - then.wall, now.mono - then.mono, 0);

/** For "at least" rules: the smaller of both clocks, never below 0; a wall clock set forward does not shorten a wait. */
export const shortestSince = (then: Moment, now: Moment): number =>
  Math.max(Math.min(now.wall - then.wall, now.mono - then.mono), 0);
