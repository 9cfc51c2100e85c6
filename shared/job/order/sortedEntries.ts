/** The set of entries in one fixed order, whatever order they arrived in: by log, number and id. */
import type { Entry } from '../entry';
import { isEntry, textOf } from './readEntry';

export interface SortedEntries {
  entries: Entry[];
  /** Ids that came with two different contents: one is kept, neither is trusted. */
  twice: string[];
}

const byText = (a: string, b: string): number => (a < b ? -1 : Number(a > b));

function firstOf(same: Entry[]): { entry: Entry; differ: boolean } | undefined {
  const [first, ...others] = same;
  if (!first) return undefined;
  if (others.every((each) => each === first)) return { entry: first, differ: false };
  const texts = same
    .map((entry) => ({ entry, text: textOf(entry) ?? '' }))
    .sort((a, b) => byText(a.text, b.text));
  return { entry: texts[0]?.entry ?? first, differ: texts.some(({ text }) => text !== texts[0]?.text) };
}

/** Drops what is no entry and what came more than once. */
export function sortedEntries(given: readonly unknown[]): SortedEntries {
  const byId = new Map<string, Entry[]>();
  for (const entry of given) {
    if (!isEntry(entry)) continue;
    const same = byId.get(entry.id);
    if (same) same.push(entry);
    else byId.set(entry.id, [entry]);
  }
  const kept = [...byId.values()].flatMap((same) => firstOf(same) ?? []);
  return {
    entries: kept
      .map(({ entry }) => entry)
      .sort((a, b) => byText(a.log, b.log) || a.seq - b.seq || byText(a.id, b.id)),
    twice: kept
      .filter(({ differ }) => differ)
      .map(({ entry }) => entry.id)
      .sort(),
  };
}
