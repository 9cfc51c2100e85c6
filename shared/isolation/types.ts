/** The answers of the isolation engine: what is live, which isolators, what to measure. */
import type { Isolator, Source } from '../panel/panelSchema';

/** A thing that is, or may be, live and why: `path` reads from the source to the place. */
export interface Live {
  supply?: string;
  V: number;
  /** True when it cannot be shown dead (back-feed through an input, say), rather than known live. */
  maybe: boolean;
  path: string[];
}

export interface Reach {
  supplies: Map<string, Live>;
  groups: Map<string, Live>;
  terminals: Map<string, Live>;
  /** Live places that are no terminal: `incoming:Q1` = the incoming terminals of Q1. */
  places: Map<string, Live>;
}

export interface StillLive extends Live {
  terminal?: string;
  /** Isolator whose incoming terminals stay live. */
  incomingOf?: string;
}

export interface PlannedIsolator {
  isolator: Isolator;
  /** Whom to tell before opening it: what else goes dead. */
  tell: string[];
  /** Must the door be open to reach it? Then its incoming side is measured first. */
  afterDoor: boolean;
  /** No load break: open only after its current reads 0. */
  currentMustBeZero: boolean;
  /** Cannot be locked: tag plus one more measure. */
  extraMeasure: boolean;
}

export interface LockPlan {
  /** In opening order. */
  isolators: PlannedIsolator[];
  weight: number;
  /** Supplies left on with their guard. */
  guarded: { supply: string; reason: string; guard: string }[];
  /** Incoming sides inside the enclosure that stay live and are covered, not worked. */
  cover: StillLive[];
  /** Non-electrical sources with their isolators, released after the electrical ones. */
  otherEnergy: Source[];
  /** False when the search stopped at its time limit: checked, but not proven least. */
  proven: boolean;
}

export type Pair =
  | '+/0 V'
  | '+/PE'
  | '0 V/PE'
  | 'L/N'
  | 'L/PE'
  | 'N/PE'
  | 'L1/L2'
  | 'L2/L3'
  | 'L1/L3'
  | 'L1/PE'
  | 'L2/PE'
  | 'L3/PE'
  | 'L1/N'
  | 'L2/N'
  | 'L3/N'
  // A terminal on a pole that the file does not name, against each pole there is.
  | `?/${'+' | '0 V' | 'L' | 'N' | 'L1' | 'L2' | 'L3' | 'PE'}`;

export interface DeadTest {
  /** Stable: `dead.<supply|group|point tag>.<pair with - for />`. */
  id: string;
  at: { supply: string } | { group: string } | { point: string };
  /** First and second terminal the probes touch; the second may be the earth terminal. */
  terminal: string;
  second: string;
  supply: string;
  pair: Pair;
  limitV: number;
  /** False for a pair to PE on an unearthed supply: it proves nothing, the step says so. */
  proves: boolean;
  /** A terminal of a point in scope: it can be read as the first step of that point. */
  worked?: boolean;
}

export interface Wait {
  supply: string;
  t60S: number | null;
  t1S: number | null;
  statedS?: number;
}
