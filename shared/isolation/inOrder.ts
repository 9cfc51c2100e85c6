/** One fixed order for tags, so that the order of a file changes no answer. */

/** By UTF-16 code units. */
export const byCodeUnits = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

const partsOf = (tag: string): string[] => tag.match(/\d+|\D+/g) ?? [];

interface Read {
  tag: string;
  parts: string[];
}

function compareRead(a: Read, b: Read): number {
  for (const [place, part] of a.parts.entries()) {
    const match = b.parts[place];
    if (match === undefined) return 1;
    const numbers = /^\d/.test(part) && /^\d/.test(match);
    const difference = numbers ? Number(part) - Number(match) : byCodeUnits(part, match);
    if (difference !== 0) return difference;
  }
  return a.tag.length - b.tag.length || byCodeUnits(a.tag, b.tag);
}

const read = (tag: string): Read => ({ tag, parts: partsOf(tag) });

/** As a person reads terminals: X3:9 before X3:14; equal numbers fall back on code units. */
export const asRead = (a: string, b: string): number => (a === b ? 0 : compareRead(read(a), read(b)));

/** A sorted copy, as a person reads the tags; each tag is taken apart once. */
export function inReadingOrder<T>(items: Iterable<T>, tagOf: (item: T) => string): T[] {
  return [...items]
    .map((item) => ({ item, ...read(tagOf(item)) }))
    .sort(compareRead)
    .map(({ item }) => item);
}
