/** One fixed order for tags, so that the order of a file changes no answer. */

/** By UTF-16 code units. */
export const byCodeUnits = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

const parts = (tag: string): string[] => tag.match(/\d+|\D+/g) ?? [];

/** As a person reads terminals: X3:9 before X3:14; equal numbers fall back on code units. */
export function asRead(a: string, b: string): number {
  const other = parts(b);
  for (const [place, part] of parts(a).entries()) {
    const match = other[place];
    if (match === undefined) return 1;
    const numbers = /^\d/.test(part) && /^\d/.test(match);
    const difference = numbers ? Number(part) - Number(match) : byCodeUnits(part, match);
    if (difference !== 0) return difference;
  }
  return a.length - b.length || byCodeUnits(a, b);
}
