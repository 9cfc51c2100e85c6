/** Sorts what arrived into held, set aside and new, and sees that each new entry joins its log. Pure. */
import type { Acknowledged } from './answers';
import { refusedAt, type Arrival } from './received';

/** What the database holds of what a push names. */
export interface Held {
  /** Entry id → its hash and order. */
  entries: ReadonlyMap<string, { hash: string; order: number }>;
  /** `id hash` of entries set aside before. */
  setAside: ReadonlySet<string>;
  /** `log hash` → seq, of everything held that a new entry may follow. */
  parents: ReadonlyMap<string, number>;
}

export interface Sorted {
  fresh: Arrival[];
  aside: Arrival[];
  acknowledged: Acknowledged[];
}

export const placeOf = (log: string, hash: string): string => `${log} ${hash}`;

/**
 * In the order in which they may be stored: an entry after the one it names. The answer for a new entry is made when it
 * has its order. `missing` names the logs that lack what comes before.
 */
export function sortArrivals(
  arrivals: readonly Arrival[],
  held: Held,
): { sorted: Sorted; missing: Set<string> } {
  const sorted: Sorted = { fresh: [], aside: [], acknowledged: [] };
  const missing = new Set<string>();
  const parents = new Map(held.parents);
  const taken = new Map<string, string>();
  for (const arrival of [...arrivals].sort((a, b) => a.entry.seq - b.entry.seq || a.index - b.index)) {
    const { entry, hash } = arrival;
    const known = held.entries.get(entry.id);
    const same = taken.get(entry.id);
    if (known?.hash === hash) sorted.acknowledged.push({ id: entry.id, order: known.order, setAside: false });
    else if (same === hash) continue;
    else if (!joins(arrival, parents)) missing.add(entry.log);
    else {
      const aside = known !== undefined || same !== undefined || held.setAside.has(`${entry.id} ${hash}`);
      (aside ? sorted.aside : sorted.fresh).push(arrival);
      if (!aside) taken.set(entry.id, hash);
      parents.set(placeOf(entry.log, hash), entry.seq);
    }
  }
  return { sorted, missing };
}

/** @throws Refused 422 when the numbers of a log do not follow one another. */
function joins({ entry, index }: Arrival, parents: ReadonlyMap<string, number>): boolean {
  if ((entry.previous === null) !== (entry.seq === 1))
    throw refusedAt('broken-log', [
      { path: `entries.${index}.previous`, says: 'only the first entry has none' },
    ]);
  if (entry.previous === null) return true;
  const parent = parents.get(placeOf(entry.log, entry.previous));
  if (parent !== undefined && parent !== entry.seq - 1)
    throw refusedAt('broken-log', [{ path: `entries.${index}.seq`, says: `must be ${parent + 1}` }]);
  return parent !== undefined;
}
