/** An entry in its place: whose it is, what it says, and what it had seen. Order is ancestry alone. */
import type { Entry, EntryKind, EntryOf, KnownEntry } from '../entry';

export interface Placed {
  /** Place in one order that agrees with ancestry; for walking through, never for judging. */
  at: number;
  entry: Entry;
  /** Undefined for a kind or body this version does not know. */
  known: KnownEntry | undefined;
  person: string;
  /** Number of its log among the logs of the job. */
  log: number;
  seq: number;
  /** For each log the highest number it had seen; of its own log its own number. */
  clock: Int32Array;
  /**
   * Only in the part of a log that has forked: the entries of that part it follows by `previous`.
   * Nobody can say which branch another log means by a number in that part, so only these count as before it.
   */
  branch?: ReadonlySet<Placed>;
}

/** A placed entry of one kind, its body read. */
export type PlacedOf<K extends EntryKind> = Placed & { known: EntryOf<K> };

export const isOf = <K extends EntryKind>(placed: Placed, kind: K): placed is PlacedOf<K> =>
  placed.known?.kind === kind;

/** Had `later` seen `earlier`? */
export function before(earlier: Placed, later: Placed): boolean {
  if (earlier === later) return false;
  if (earlier.branch) return later.log === earlier.log && (later.branch?.has(earlier) ?? false);
  return isKnownTo(earlier, later);
}

/**
 * Might `later` have seen `earlier`? The same as `before`, but a number in a forked part means every branch.
 * What shuts a gate is judged by this.
 */
export function isKnownTo(earlier: Placed, later: Placed): boolean {
  const upTo = later.clock[earlier.log] ?? 0;
  return earlier.log === later.log ? earlier.seq < later.seq : upTo >= earlier.seq;
}

export const concurrent = (a: Placed, b: Placed): boolean => a !== b && !before(a, b) && !before(b, a);
