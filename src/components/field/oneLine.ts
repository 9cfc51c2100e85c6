// What an entry refuses in words: pasted text brings it along unseen (shared/panel/units.ts names the same signs).
const unseen = /[\p{Cc}\u200e\u200f\u202a-\u202e\u2066-\u2069]/gu;

/** Words a person typed as one line: entries hold no line breaks, control or direction characters. */
export const oneLine = (words: string): string =>
  words.replace(/\s+/g, ' ').replace(unseen, '').replace(/ {2,}/g, ' ').trim();
