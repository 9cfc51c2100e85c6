/** Which other files of this app a file of it names. */

const inHtml = /(?:src|href)="([^"]+)"/g;
const inScript = /(?:\bfrom|\bimport)\s*\(?\s*["'`](\.{1,2}\/[^"'`]+\.js)["'`]/g;
const inStyle = /url\(["']?([^"')]+)["']?\)/g;

function named(text: string, base: string, pattern: RegExp): string[] {
  return [...text.matchAll(pattern)]
    .map(([, name = '']) => new URL(name, base))
    .filter(({ origin }) => origin === new URL(base).origin)
    .map(({ href }) => href);
}

/** Whole addresses of the same origin: in HTML by src and href, in a script by its imports, in a style by url(). */
export function namesIn(url: string, text: string): string[] {
  if (url.endsWith('.html')) return named(text, url, inHtml);
  if (url.endsWith('.js')) return named(text, url, inScript);
  return url.endsWith('.css') ? named(text, url, inStyle) : [];
}
