/** Entries that are named but held nowhere: what a log is heard to, and where it goes on. */
import type { Entry } from '../entry';

export interface Hole {
  log: string;
  /** Heard without a hole up to here. */
  heard: number;
  /** The highest number missing in this hole. */
  upTo: number;
}

function highestNamed(entries: readonly Entry[]): Map<string, number> {
  const named = new Map<string, number>();
  for (const { seen } of entries)
    for (const [log, seq] of Object.entries(seen)) if (seq > (named.get(log) ?? 0)) named.set(log, seq);
  return named;
}

/**
 * By log, ascending.
 * @param all entries held, by log and number: what is held of a person who left the job is no hole.
 * @param counting those of people on the job: only what they wrote or name is asked for.
 */
export function holesOf(all: readonly Entry[], counting: readonly Entry[]): Hole[] {
  const named = highestNamed(counting);
  const asked = new Set([...named.keys(), ...counting.map(({ log }) => log)]);
  const sorted = all.filter(({ log }) => asked.has(log));
  const held = new Map<string, number>();
  const holes: Hole[] = [];
  for (const { log, seq } of sorted) {
    const last = held.get(log) ?? 0;
    if (seq > last + 1) holes.push({ log, heard: last, upTo: seq - 1 });
    held.set(log, seq);
  }
  for (const [log, seq] of named) {
    const last = held.get(log) ?? 0;
    if (seq > last) holes.push({ log, heard: last, upTo: seq });
  }
  return holes.sort((a, b) => (a.log < b.log ? -1 : Number(a.log > b.log)) || a.heard - b.heard);
}
