/** Keys and values → a sentence, from whatever messages are at hand: the server has all, a phone those of its screens. */
import type { Language } from '../api/common';
import type { Text } from '../panel/says';
import { formatMessage } from './formatMessage';

export { formatNumber } from './formatMessage';

/**
 * Renders a text from `messages`, where the first that holds the key wins.
 * @throws Error when none holds the key: a missing sentence is a fault, not a blank.
 */
export function renderWith(
  messages: readonly (Readonly<Record<string, string>> | undefined)[],
  language: Language,
  { key, params = {} }: Text,
): string {
  const message = messages.find((each) => each?.[key] !== undefined)?.[key];
  if (message === undefined) throw new Error(`no wording for "${key}" in ${language}`);
  const values: Record<string, string | number> = {};
  for (const [name, value] of Object.entries(params))
    values[name] = typeof value === 'object' ? renderWith(messages, language, value) : value;
  return formatMessage(language, message, values);
}
