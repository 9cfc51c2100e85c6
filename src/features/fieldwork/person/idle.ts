/** Has nobody touched this phone for ten minutes? Then the next answer asks for the PIN. */
import { longestSince, nowMoment, type Moment } from './elapsed';

/** sync.md: "so does the first answer after 10 idle minutes". */
export const idleMs = 10 * 60_000;
const key = 'coldloop.touched';

let last: Moment | undefined;
let longestGap = 0;

function lastTouch(): Moment {
  if (last) return last;
  // After a reload the monotonic clock starts anew: only the wall clock spans it.
  const wall = Number(sessionStorage.getItem(key) ?? Date.now());
  return { wall, mono: performance.now() };
}

/** A hand on the screen. Remembers the longest gap until somebody proves who they are. */
export function touch(): void {
  const now = nowMoment();
  longestGap = Math.max(longestGap, longestSince(lastTouch(), now));
  last = now;
  sessionStorage.setItem(key, String(now.wall));
}

/** Was there a gap of ten minutes since the last PIN? */
export function wasIdle(): boolean {
  return Math.max(longestGap, longestSince(lastTouch(), nowMoment())) >= idleMs;
}

/** The PIN was right just now. */
export function presenceProven(): void {
  longestGap = 0;
  last = nowMoment();
  sessionStorage.setItem(key, String(last.wall));
}
