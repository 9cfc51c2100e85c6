/** Puts entries into one order that agrees with what each had seen, and works out what that was. */
import type { Entry } from '../entry';
import { branches } from './branches';
import type { Log } from './logs';
import type { Placed } from './placed';
import { knownEntry } from './readEntry';

interface Walk {
  logs: readonly Log[];
  numbers: Map<string, number>;
  /** How many levels of each log are placed. */
  done: number[];
  /** For each log and level: everything known once that level is. */
  known: Int32Array[][];
  placed: Placed[];
}

/** How many levels of a log have a number up to `seq`. Logs have few holes, so the place is near the number. */
function levelsUpTo({ levels }: Log, seq: number): number {
  let count = Math.min(seq, levels.length);
  while (count > 0 && (levels[count - 1]?.seq ?? 0) > seq) count -= 1;
  return count;
}

function merge(into: Int32Array, from: Int32Array | undefined): void {
  from?.forEach((seq, log) => {
    if (seq > (into[log] ?? 0)) into[log] = seq;
  });
}

/** The other logs an entry names, as log and number of levels. */
function seenBy(walk: Walk, entry: Entry): [log: number, levels: number][] {
  return Object.entries(entry.seen).flatMap(([id, seq]): [number, number][] => {
    const log = walk.numbers.get(id);
    const named = log === undefined ? undefined : walk.logs[log];
    if (log === undefined || !named || id === entry.log) return [];
    return [[log, levelsUpTo(named, seq)]];
  });
}

function isReady(walk: Walk, log: number): boolean {
  const next = walk.logs[log]?.levels[walk.done[log] ?? 0];
  return (
    next?.entries.every((entry) =>
      seenBy(walk, entry).every(([other, levels]) => (walk.done[other] ?? 0) >= levels),
    ) ?? false
  );
}

/** Numbers that an entry claims to have seen but that come after it are left out: nobody sees ahead. */
function clockOf(walk: Walk, log: number, entry: Entry): Int32Array {
  const level = walk.done[log] ?? 0;
  const clock = new Int32Array(walk.logs.length);
  merge(clock, walk.known[log]?.[level - 1]);
  for (const [other, levels] of seenBy(walk, entry))
    merge(clock, walk.known[other]?.[Math.min(levels, walk.done[other] ?? 0) - 1]);
  clock[log] = entry.seq;
  return clock;
}

function place(walk: Walk, log: number): void {
  const level = walk.done[log] ?? 0;
  const { person = '', levels = [] } = walk.logs[log] ?? {};
  const known = new Int32Array(walk.logs.length);
  for (const entry of levels[level]?.entries ?? []) {
    const clock = clockOf(walk, log, entry);
    merge(known, clock);
    const at = walk.placed.length;
    walk.placed.push({ at, entry, known: knownEntry(entry), person, log, seq: entry.seq, clock });
  }
  walk.known[log]?.push(known);
  walk.done[log] = level + 1;
}

/** Places what is ready, log by log; true when anything was. */
function round(walk: Walk): boolean {
  let moved = false;
  walk.logs.forEach((_log, index) => {
    while (isReady(walk, index)) {
      place(walk, index);
      moved = true;
    }
  });
  return moved;
}

/** Total: entries that claim to have seen each other are placed too, the first log first. */
export function inOrder(logs: readonly Log[]): Placed[] {
  const walk: Walk = {
    logs,
    numbers: new Map(logs.map(({ id }, index) => [id, index])),
    done: logs.map(() => 0),
    known: logs.map(() => []),
    placed: [],
  };
  for (;;) {
    if (round(walk)) continue;
    const stuck = logs.findIndex(({ levels }, index) => (walk.done[index] ?? 0) < levels.length);
    if (stuck < 0) break;
    place(walk, stuck);
  }
  branches(logs, walk.placed);
  return walk.placed;
}
