/** Flesch–Kincaid grade of a text: how many years of school it asks for. */

export interface Counts {
  words: number;
  sentences: number;
  syllables: number;
}

/** 0.39 · words/sentences + 11.8 · syllables/words − 15.59 (reference/standards.md §11.6). */
export const fleschKincaidGrade = ({ words, sentences, syllables }: Counts): number =>
  0.39 * (words / sentences) + 11.8 * (syllables / words) - 15.59;

/** A final e, es or ed that is not spoken: fuse, wires, closed; but handle, fuses and rated speak it. */
const silentEnd = /(?:(?<=[^aeiouy])(?<![^aeiouy]l)e|(?<=[^aeiouysxzcg])(?<!ch|sh)es|(?<=[^aeiouytd])ed)$/;

/**
 * Syllables of an English word by its vowel groups, less a silent final e.
 * A tag or a number (X3:14, 24) is a symbol that is recognised, not spelled: it counts as one.
 */
export function syllablesIn(token: string): number {
  const letters = token.replace(/[^A-Za-z]/g, '');
  if (/\d/.test(token)) return 1;
  // AC, PE, AWG are spelled out loud, one syllable a letter.
  if (letters.length > 1 && letters === letters.toUpperCase()) return letters.length;
  const word = letters.toLowerCase();
  if (word.length <= 3) return 1;
  const trimmed = word.replace(silentEnd, '').replace(/^y/, '');
  return Math.max(1, (trimmed.match(/[aeiouy]{1,2}/g) ?? []).length);
}

/** A sentence ends at . ! ? or : before a space or the end, so that 2.4 and X3:14 do not end one. */
export function countsOf(text: string): Counts {
  const sentences = text.split(/[.!?]+(?=\s|$)/).filter((part) => /[a-z0-9]/i.test(part));
  const words = text.split(/\s+/).filter((token) => /[a-z0-9]/i.test(token));
  return {
    words: words.length,
    sentences: Math.max(1, sentences.length),
    syllables: words.reduce((sum, word) => sum + syllablesIn(word), 0),
  };
}
