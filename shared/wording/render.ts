/** Keys and values → a sentence in a language. Messages are ICU MessageFormat. */
import { IntlMessageFormat } from 'intl-messageformat';
import type { Language } from '../api/common';
import type { Text } from '../panel/says';
import { en } from './en';
import { es } from './es';

export type WordingKey = keyof typeof en;
const messages: Record<Language, Record<string, string>> = { en, es };
const compiled = new Map<string, IntlMessageFormat>();

function format(language: Language, message: string): IntlMessageFormat {
  const cacheKey = `${language}\u0000${message}`;
  const known = compiled.get(cacheKey);
  if (known) return known;
  const made = new IntlMessageFormat(message, language, undefined, { ignoreTag: true });
  compiled.set(cacheKey, made);
  return made;
}

/** Numbers in the trade's way: a decimal point in both languages (meters and drawings show one), at most 3 decimals, no thousands mark. */
export function formatNumber(value: number): string {
  return String(Number(value.toFixed(Math.abs(value) >= 100 ? 1 : 3)));
}

/**
 * Renders a text. A message carried in a pack (`carried`) wins over the app's own, so a job reads the same after an update.
 * @throws Error when no language file holds the key: a missing sentence is a fault, not a blank.
 */
export function render(language: Language, said: Text, carried?: Record<string, string>): string {
  const message = carried?.[said.key] ?? messages[language][said.key];
  if (message === undefined) throw new Error(`no wording for "${said.key}" in ${language}`);
  const values: Record<string, string | number> = {};
  for (const [name, value] of Object.entries(said.params ?? {}))
    values[name] = typeof value === 'object' ? render(language, value, carried) : value;
  // Plural forms need the number; everything else is shown as the trade writes it.
  const shown = Object.fromEntries(
    Object.entries(values).map(([name, value]) => [
      name,
      typeof value === 'number' && !message.includes(`{${name}, plural`) ? formatNumber(value) : value,
    ]),
  );
  return String(format(language, message).format(shown));
}

export const messageOf = (language: Language, key: string): string | undefined => messages[language][key];
