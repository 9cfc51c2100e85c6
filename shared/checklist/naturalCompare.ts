/** The order in which a person reads tags: X1:2 before X1:10, the same on every machine and in every language. */
const pieces = /(\d+)/;

/** Negative when `a` is read before `b`. Digits compare as numbers, the rest by UTF-16 code units. */
export function naturalCompare(a: string, b: string): number {
  if (a === b) return 0;
  const left = a.split(pieces);
  const right = b.split(pieces);
  for (let i = 0; i < Math.min(left.length, right.length); i += 1) {
    const x = left[i] ?? '';
    const y = right[i] ?? '';
    if (x === y) continue;
    // split() with one capture group puts digits at the odd places.
    const byNumber = i % 2 === 1 ? Number(x) - Number(y) : 0;
    if (byNumber !== 0) return byNumber;
    return x < y ? -1 : 1;
  }
  return left.length - right.length;
}
