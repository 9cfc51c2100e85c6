/** The order in which a person reads tags: X1:2 before X1:10, the same on every machine and in every language. */
const isDigit = (code: number): boolean => code >= 48 && code <= 57;

function digitsAt(text: string, from: number): string {
  let end = from;
  while (isDigit(text.charCodeAt(end))) end += 1;
  return text.slice(from, end);
}

/** Numbers by their value; 01 and 1 are equal as numbers and then compared as written. */
function byNumber(a: string, b: string): number {
  return Number(a) - Number(b) || (a < b ? -1 : 1);
}

/** Where two tags first differ, or where the number begins in which they do. */
function firstDifference(a: string, b: string): number {
  let at = 0;
  while (at < a.length && a.charCodeAt(at) === b.charCodeAt(at)) at += 1;
  const inNumber = isDigit(a.charCodeAt(at)) || isDigit(b.charCodeAt(at));
  while (inNumber && at > 0 && isDigit(a.charCodeAt(at - 1))) at -= 1;
  return at;
}

/** A tag that ends here comes first, then one that goes on with a number. */
function rankAt(text: string, at: number): number {
  if (at >= text.length) return 0;
  return isDigit(text.charCodeAt(at)) ? 1 : 2;
}

/** Negative when `a` is read before `b`. Digits compare as numbers, the rest by UTF-16 code units. */
export function naturalCompare(a: string, b: string): number {
  if (a === b) return 0;
  const at = firstDifference(a, b);
  const [x, y] = [a.charCodeAt(at), b.charCodeAt(at)];
  if (isDigit(x) && isDigit(y)) return byNumber(digitsAt(a, at), digitsAt(b, at));
  return rankAt(a, at) - rankAt(b, at) || x - y;
}
