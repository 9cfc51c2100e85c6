/** Marks the tags inside a text before it is rendered, so that the screen can put them in boxes afterwards. */
import type { Text } from '../../../shared/panel/says';

// Private-use characters: no wording and no panel file can hold them by accident.
export const tagStart = '\uE000';
export const tagEnd = '\uE001';

/** The same text with every parameter that names a thing on the drawing set between marks. */
export function markTags(said: Text, isTag: (word: string) => boolean): Text {
  if (!said.params) return said;
  const params = Object.entries(said.params).map(([name, value]): [string, string | number | Text] => {
    if (typeof value === 'object') return [name, markTags(value, isTag)];
    return [name, typeof value === 'string' && isTag(value) ? `${tagStart}${value}${tagEnd}` : value];
  });
  return { key: said.key, params: Object.fromEntries(params) };
}

/** A marked text without its marks: what a screen reader hears and an entry keeps. */
export const withoutMarks = (marked: string): string =>
  marked.replaceAll(tagStart, '').replaceAll(tagEnd, '');
