/** Keys and values → a sentence in a language, with every message there is. Messages are ICU MessageFormat. */
import type { Language } from '../api/common';
import type { Text } from '../panel/says';
import { en } from './en';
import { es } from './es';
import { renderWith } from './renderWith';

export { formatNumber } from './renderWith';

export type WordingKey = keyof typeof en;
const messages: Record<Language, Record<string, string>> = { en, es };

/**
 * Renders a text. A message carried in a pack (`carried`) wins over the app's own, so a job reads the same after an update.
 * @throws Error when no language file holds the key: a missing sentence is a fault, not a blank.
 */
export const render = (language: Language, said: Text, carried?: Record<string, string>): string =>
  renderWith([carried, messages[language]], language, said);

export const messageOf = (language: Language, key: string): string | undefined => messages[language][key];
