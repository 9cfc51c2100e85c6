/** Entries that are named but held nowhere: what a log is heard to, and where it goes on. */
import type { Entry } from '../entry';

export interface Hole {
  log: string;
  /** Heard without a hole up to here. */
  heard: number;
  /** The highest number missing in this hole. */
  upTo: number;
}

function highestNamed(sorted: readonly Entry[]): Map<string, number> {
  const named = new Map<string, number>();
  for (const { seen } of sorted)
    for (const [log, seq] of Object.entries(seen)) if (seq > (named.get(log) ?? 0)) named.set(log, seq);
  return named;
}

/** By log, ascending. @param sorted entries by log and number. */
export function holesOf(sorted: readonly Entry[]): Hole[] {
  const held = new Map<string, number>();
  const holes: Hole[] = [];
  for (const { log, seq } of sorted) {
    const last = held.get(log) ?? 0;
    if (seq > last + 1) holes.push({ log, heard: last, upTo: seq - 1 });
    held.set(log, seq);
  }
  for (const [log, seq] of highestNamed(sorted)) {
    const last = held.get(log) ?? 0;
    if (seq > last) holes.push({ log, heard: last, upTo: seq });
  }
  return holes.sort((a, b) => (a.log < b.log ? -1 : Number(a.log > b.log)) || a.heard - b.heard);
}
